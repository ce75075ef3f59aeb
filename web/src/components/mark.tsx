/** Our mark: a motion that dies away and comes to rest inside its band. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg width={size} height={(size * 32) / 36} viewBox="0 0 36 32" aria-hidden="true" focusable="false">
      <rect x="0" y="10" width="36" height="15" style={{ fill: "color-mix(in srgb, var(--band) 30%, transparent)" }} />
      <path d="M0 14.7h36M0 20.3h36" strokeWidth="1" opacity="0.55" style={{ stroke: "var(--band-line)" }} />
      <path d="M0 10h36M0 25h36" strokeWidth="2" style={{ stroke: "var(--band-line)" }} />
      <path
        d="M1.2 1.8C6.4 1.8 6.6 30 12.2 30C17 30 17.4 7.6 22.4 7.6C26.4 7.6 26.4 17.6 31 17.6"
        strokeWidth="2.8"
        strokeLinecap="round"
        style={{ fill: "none", stroke: "var(--ink)" }}
      />
      <circle cx="31" cy="17.6" r="4" style={{ fill: "var(--ink)" }} />
    </svg>
  );
}
