import { describe, expect, it } from "vitest";
import { facesFor, type Face } from "../../../web/src/components/embedded-faces.ts";

const face = (family: string, ranges: string): Face => ({
  family,
  ranges,
  weight: "400",
  style: "normal",
  address: "",
});
const latin = face("Reading", "U+0000-00FF, U+2212");
const more = face("Reading", "U+0100-02BA");
const signs = face("Signs", "U+03BC");
const other = face("Heading", "");
const faces = [latin, more, signs, other];

describe("the faces written into a drawing", () => {
  it("are those of its families that hold its signs", () => {
    expect(facesFor("x = −3", "Reading, Signs", faces)).toEqual([latin]);
    expect(facesFor("12 μm", "Reading, Signs", faces)).toEqual([latin, signs]);
    expect(facesFor("Łódź", "Reading, Signs", faces)).toEqual([latin, more]);
  });

  it("are no others, and one that names no signs has them all", () => {
    expect(facesFor("μ", "Reading", faces)).toEqual([]);
    expect(facesFor("μ", "Heading", faces)).toEqual([other]);
  });
});
