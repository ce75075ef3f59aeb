import { describe, expect, it } from "vitest";
import { faultOfPassword } from "../../api/src/accounts/password-rules.ts";

const own = { name: "Ines Duarte", email: "ines.duarte@okarin.example" };

describe("a new password", () => {
  it.each([
    "pour slate across winch",
    "            x             ",
    "ぴったり十二文字のあいことば",
    "🔧🔩🪛🪚🔨⛏️🗜️⚙️🧲🪜🧰🪝",
    "correct horse battery staple",
    "ines likes pears and plums",
    "ünïcödé wörds",
    "839402758174",
  ])("may be %j", (password) => {
    expect(faultOfPassword(password, own)).toBeNull();
  });

  it("is counted in characters, not in what they take to store", () => {
    expect(faultOfPassword("🔧🔩🪛🪚🔨⛏", own)).toContain("this one has 6");
    expect(faultOfPassword("elevenchars", own)).toContain("this one has 11");
  });

  it.each([
    "unbelievable",
    "password2024",
    "Password!!!!!",
    "123password123",
    "123456789012",
    "210987654321",
    "aaaaaaaaaaaa",
    "abcabcabcabc",
    "qwerqwerqwer",
    "abcdefghijklm",
  ])("may not be %j, which is tried early", (password) => {
    expect(faultOfPassword(password, own)).toContain("among the first");
  });

  it.each(["ines.duarte@okarin.example", "InesDuarte1985", "duarte-ines-7", "restbandrestband"])(
    "may not be %j, made of the name or address",
    (password) => {
      expect(faultOfPassword(password, own)).toContain("name or the address");
    },
  );
});
