/** A face of the page: its family, the signs it has, and where its file is. */
export interface Face {
  readonly family: string;
  readonly weight: string;
  readonly style: string;
  readonly ranges: string;
  readonly address: string;
}

/** The page's faces that hold signs of a text in one of the families, as rules of a style sheet with the files in them. */
export async function embeddedFaces(text: string, families: string): Promise<string> {
  const needed = facesFor(text, families, pageFaces());
  return (await Promise.all(needed.map(ruleOf))).join("\n");
}

/** Those of the faces that a text needs: of the families named, with at least one of its signs. */
export function facesFor(text: string, families: string, faces: readonly Face[]): Face[] {
  const signs = [...new Set(text)].map((sign) => sign.codePointAt(0) ?? 0);
  return faces.filter(
    ({ family, ranges }) =>
      families.includes(family) &&
      signs.some((sign) => rangesOf(ranges).some(([low, high]) => sign >= low && sign <= high)),
  );
}

/** "U+0000-00FF, U+2212" as pairs of code points; everything where nothing is said. */
function rangesOf(ranges: string): [number, number][] {
  if (ranges === "") return [[0, 0x10ffff]];
  return ranges.split(",").map((range) => {
    const [low, high] = range.trim().replace(/^U\+/i, "").split("-");
    return [parseInt(low, 16), parseInt(high ?? low, 16)];
  });
}

function pageFaces(): Face[] {
  const rules = [...document.styleSheets].flatMap((sheet) => [...sheet.cssRules]);
  return rules.flatMap((rule) => {
    if (!(rule instanceof CSSFontFaceRule)) return [];
    const said = (name: string): string => rule.style.getPropertyValue(name).trim();
    const [, file] = /url\("?([^")]+)"?\)/.exec(said("src")) ?? [];
    if (file === undefined) return [];
    return {
      family: said("font-family").replace(/["']/g, ""),
      weight: said("font-weight") || "400",
      style: said("font-style") || "normal",
      ranges: said("unicode-range"),
      address: new URL(file, rule.parentStyleSheet?.href ?? document.baseURI).href,
    };
  });
}

async function ruleOf({ family, weight, style, ranges, address }: Face): Promise<string> {
  const file = await (await fetch(address)).blob();
  const range = ranges === "" ? "" : `unicode-range:${ranges};`;
  return `@font-face{font-family:"${family}";font-weight:${weight};font-style:${style};${range}src:url(${await inlined(file)}) format("woff2")}`;
}

/** A file as an address that holds it. */
function inlined(file: Blob): Promise<string> {
  return new Promise((settle, fail) => {
    const reader = new FileReader();
    reader.onload = () => settle(reader.result as string);
    reader.onerror = () => fail(new Error("The face could not be read."));
    reader.readAsDataURL(file);
  });
}
