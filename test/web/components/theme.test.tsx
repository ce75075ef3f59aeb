import { readFileSync } from "node:fs";
import { act, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ThemeButton } from "../../../web/src/components/theme-button.tsx";
import { chooseTheme, chosenTheme, followSystemTheme } from "../../../web/src/components/theme.ts";

let isSystemDark = false;
let tellChange: () => void = () => undefined;

beforeEach(() => {
  isSystemDark = false;
  vi.stubGlobal("matchMedia", () => ({
    get matches() {
      return isSystemDark;
    },
    addEventListener: (_: string, listener: () => void) => (tellChange = listener),
  }));
});
afterEach(() => {
  chooseTheme(null);
  vi.unstubAllGlobals();
});

const shown = () => document.documentElement.dataset.theme;

describe("the theme", () => {
  it("is changed by the button and remembered", async () => {
    render(<ThemeButton />);
    await userEvent.click(screen.getByRole("button", { name: "Show the page dark" }));
    expect(shown()).toBe("dark");
    expect(chosenTheme()).toBe("dark");
    await userEvent.click(screen.getByRole("button", { name: "Show the page light" }));
    expect(shown()).toBe("light");
    expect(chosenTheme()).toBe("light");
  });

  it("follows the system while nothing is chosen, and a choice holds against it", () => {
    followSystemTheme();
    isSystemDark = true;
    act(() => tellChange());
    expect(shown()).toBe("dark");
    act(() => chooseTheme("light"));
    act(() => tellChange());
    expect(shown()).toBe("light");
    act(() => chooseTheme(null));
    expect(shown()).toBe("dark");
  });

  it("is in force before the first paint, by the same memory", () => {
    const boot = readFileSync("web/public/theme.js", "utf8");
    // eslint-disable-next-line @typescript-eslint/no-implied-eval -- the script as the page runs it
    const run = new Function(boot) as () => void;
    act(() => chooseTheme("dark"));
    document.documentElement.dataset.theme = "";
    run();
    expect(shown()).toBe("dark");
    act(() => chooseTheme(null));
    run();
    expect(shown()).toBe("light");
    isSystemDark = true;
    run();
    expect(shown()).toBe("dark");
  });
});
