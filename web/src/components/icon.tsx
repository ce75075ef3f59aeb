const shapes = {
  check: <path d="M3 8.6l3.4 3.6L13 4.2" />,
  cross: <path d="M3.5 3.5l9 9M12.5 3.5l-9 9" />,
  chevron: <path d="M3.5 6l4.5 4.5L12.5 6" />,
  theme: (
    <>
      <circle cx="8" cy="8" r="6" />
      <path d="M8 2a6 6 0 0 0 0 12z" style={{ fill: "currentColor" }} />
    </>
  ),
  undo: <path d="M3 5.5h6.5a3.5 3.5 0 0 1 0 7H6M5.8 2.6L2.8 5.5l3 2.9" />,
  redo: <path d="M13 5.5H6.5a3.5 3.5 0 0 0 0 7H10M10.2 2.6l3 2.9-3 2.9" />,
  previous: <path d="M4 3v10M12.5 3.5v9L6 8z" style={{ fill: "currentColor" }} />,
  next: <path d="M12 3v10M3.5 3.5v9L10 8z" style={{ fill: "currentColor" }} />,
  play: <path d="M4 2.8v10.4L13 8z" style={{ fill: "currentColor" }} />,
  pause: <path d="M5 3v10M11 3v10" />,
  dots: <path d="M3 8h.01M8 8h.01M13 8h.01" style={{ strokeWidth: 2.6 }} />,
  more: <path d="M3 4.5h10M3 8h10M3 11.5h10" />,
};

export type IconName = keyof typeof shapes;

/** A small drawing in the colour of the text around it. It never stands alone: the words are beside it or in the label. */
export function Icon({ name, size = 16, weight = 1.8 }: { name: IconName; size?: number; weight?: number }) {
  return (
    <svg
      className="inline-block shrink-0"
      width={size}
      height={size}
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth={weight}
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
      focusable="false"
    >
      {shapes[name]}
    </svg>
  );
}
