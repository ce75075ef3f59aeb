/** The page before there is anything to show; it says so only when that takes a while. */
export function PageFallback() {
  return (
    <>
      <div className="h-(--header) border-b border-line" />
      <p className="late page-width py-9 text-quiet" role="status">
        Opening the page
      </p>
    </>
  );
}
