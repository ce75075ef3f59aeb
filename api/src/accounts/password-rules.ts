import { dictionary } from "@zxcvbn-ts/language-common";

export const MINIMUM_LENGTH = 12;

/** The 49,233 most used passwords that the package gathered from published leaks, lower case. */
const common = new Set(dictionary["passwords-common"]);

/**
 * Says what is wrong with a new password, or null. Any characters are welcome and none are demanded: what counts is
 * length, and that nobody would try it early.
 *
 * @param own words the password may not consist of: the person's name and address
 */
export function faultOfPassword(password: string, own: { name: string; email: string }): string | null {
  const text = password.normalize("NFKC").toLowerCase();
  const length = [...text].length;
  if (length < MINIMUM_LENGTH) {
    return `A password has at least ${MINIMUM_LENGTH} characters; this one has ${length}.`;
  }
  if (isCommon(text)) return "This password is among the first that would be tried. A few unrelated words are better.";
  if (isOwn(text, own)) return "This password is made of the name or the address of the account.";
  return null;
}

function isCommon(text: string): boolean {
  const core = withoutDecoration(text);
  return common.has(text) || common.has(core) || hasShortPeriod(text) || isRun(text);
}

/** `password2024!` is `password`: digits and signs before and after the letters add next to nothing. */
function withoutDecoration(text: string): string {
  return text.replace(/^[\x20-\x60{-~]+|[\x20-\x60{-~]+$/g, "");
}

/** One to four characters over and over. */
function hasShortPeriod(text: string): boolean {
  return [1, 2, 3, 4].some((period) => text === text.slice(0, period).repeat(text.length).slice(0, text.length));
}

/** Each character next to the one before it: `123456789012` counts, the 0 after the 9 too. */
function isRun(text: string): boolean {
  const steps = [...text].slice(1).map((character, i) => character.charCodeAt(0) - text.charCodeAt(i));
  return [1, -1].some((step) => steps.every((s) => s === step || s === -9 * step));
}

function isOwn(text: string, own: { name: string; email: string }): boolean {
  const words = [own.email, own.email.split("@")[0], own.name, ...own.name.split(/\s+/), "restband"];
  const rest = words
    .map((word) => word.normalize("NFKC").toLowerCase())
    .filter((word) => word.length >= 3)
    .sort((a, b) => b.length - a.length)
    .reduce((left, word) => left.replaceAll(word, ""), text);
  // Four characters beside one's own name are no secret: "ines.duarte.1234".
  return rest !== text && rest.replace(/[^\p{L}\p{N}]/gu, "").length <= 4;
}
