import { Fragment } from "react";

/** A stretch of a formula on its line, below it or above it. */
export interface FormulaPart {
  readonly text: string;
  readonly place: "line" | "lower" | "upper";
}

/** Cuts "x_{n−1} + v^2" at its marks: `_` lowers and `^` raises the letters and figures after it, or what stands in braces. */
export function formulaParts(formula: string): FormulaPart[] {
  return formula
    .split(/([_^](?:\{[^}]*\}|[\p{L}\d]+))/u)
    .filter((text) => text !== "")
    .map((text) => {
      const mark = /^[_^](?=[\p{L}\d{])/u.exec(text)?.[0];
      if (mark === undefined) return { text, place: "line" };
      return { text: text.slice(1).replace(/^\{|\}$/g, ""), place: mark === "_" ? "lower" : "upper" };
    });
}

/** A formula, or a sentence with symbols in it, set as books set them. */
export function FormulaText({ text }: { text: string }) {
  return formulaParts(text).map(({ text: part, place }, i) => {
    if (place === "lower") return <sub key={i}>{part}</sub>;
    if (place === "upper") return <sup key={i}>{part}</sup>;
    return <Fragment key={i}>{part}</Fragment>;
  });
}
