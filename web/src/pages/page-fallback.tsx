/** The page before there is anything to show; it says so only when that takes a while. */
export function PageFallback() {
  return (
    <>
      <div className="h-(--header) border-b border-line" />
      <main id="content" tabIndex={-1} className="page-width py-9">
        <p className="late text-quiet" role="status">
          Opening the page
        </p>
      </main>
    </>
  );
}
