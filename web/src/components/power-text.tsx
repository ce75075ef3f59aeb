const POWER = /10([⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+)/;
const SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** A number whose power of ten, if it has one, is set by the page: our faces have no small figures of their own. */
export function PowerText({ text }: { text: string }) {
  const power = POWER.exec(text);
  if (!power) return text;
  const digits = [...power[1]].map((sign) => (sign === "⁻" ? "−" : SUPERSCRIPTS.indexOf(sign))).join("");
  return (
    <>
      {text.slice(0, power.index)}10<sup className="text-[0.72em]">{digits}</sup>
      {text.slice(power.index + power[0].length)}
    </>
  );
}
