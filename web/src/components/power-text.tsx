const POWERS = /10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)/u;
const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** A text whose powers of ten, if it has any, are set by the page: our faces have no small figures of their own. */
export function PowerText({ text }: { text: string }) {
  // Split at a pattern with a group: every second part is what was found.
  return text.split(POWERS).map((part, i) =>
    i % 2 === 0 ? (
      part
    ) : (
      <span key={i}>
        10<sup className="text-[0.72em]">{plainDigits(part)}</sup>
      </span>
    ),
  );
}

const plainDigits = (power: string): string =>
  [...power].map((sign) => (sign === "⁻" ? "−" : SUPERSCRIPTS.indexOf(sign))).join("");
