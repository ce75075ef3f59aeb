import { describe, expect, it } from "vitest";
import { paths, returnTarget } from "../../web/src/paths.ts";

const target = (search: string) => returnTarget(new URLSearchParams(search));

describe("the way back after signing in", () => {
  it("is the address asked for, its query and place in the page with it", () => {
    const asked = "/projects/1/scenarios/2?view=last#evidence";
    const signIn = new URL(paths.signIn(asked), "http://here");
    expect(signIn.pathname).toBe("/sign-in");
    expect(returnTarget(signIn.searchParams)).toBe(asked);
  });

  it("is the projects where nothing was asked for", () => {
    expect(target("")).toBe("/projects");
    expect(paths.signIn("/")).toBe("/sign-in");
  });

  it.each(["https://elsewhere.example/", "//elsewhere.example/", "/\\elsewhere.example", "javascript:alert(1)"])(
    "never leads to another place: %s",
    (asked) => expect(target(`return=${encodeURIComponent(asked)}`)).toBe("/projects"),
  );
});
