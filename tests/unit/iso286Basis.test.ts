import { isoDeviations, isoLimits, limits, lengthOfTicks, mm } from "limitsmith";
import { describe, expect, it } from "vitest";
import { thrown } from "../support/thrown.js";

const lastStep = (text: string): string | undefined => isoLimits(mm(8), text).basis.at(-1)?.says;

describe("the reasons of a class", () => {
  // ISO 286-1:2010, over 6 to 10 mm: IT6 9, IT7 15; k6 +10/+1, f7 -13/-28, F7 +28/+13, P7 -9/-24, js7 and JS7 ±7.5
  it.each([
    ["k6", "es = ei + IT6 = 10 µm"],
    ["f7", "ei = es - IT7 = -28 µm"],
    ["F7", "ES = EI + IT7 = 28 µm"],
    ["P7", "EI = ES - IT7 = -24 µm"],
    ["js7", "es = 7.5 µm, ei = -7.5 µm"],
    ["JS7", "ES = 7.5 µm, EI = -7.5 µm"],
  ])("%s ends with the other limit, by the names of its side", (text, says) => {
    expect(lastStep(text)).toBe(says);
  });

  it("the fundamental deviation stands with its sign, and js in the table of its side", () => {
    const says = (text: string): string | undefined => isoLimits(mm(8), text).basis[2]?.says;
    expect([says("k6"), says("f7"), says("h6"), says("k9")]).toEqual([
      "k6: ei = +1 µm",
      "f: es = -13 µm",
      "h: es = 0 µm",
      "k9: ei = 0 µm",
    ]);
    expect(isoLimits(mm(8), "js7").basis[2]?.place).toBe("Table 4, column js");
    expect(isoLimits(mm(8), "JS7").basis[2]?.place).toBe("Table 2, column JS");
  });

  it("practice is named only below the first size of a letter", () => {
    expect(thrown(() => isoLimits(mm(20), "t7")).allowed).toContain("practice takes u");
    expect(thrown(() => isoLimits(mm(20), "T7")).allowed).toContain("practice takes U");
    expect(thrown(() => isoLimits(mm(600), "v7")).allowed).not.toContain("practice");
  });

  it("a size outside is refused with what is defined", () => {
    expect(thrown(() => isoLimits(mm(3151), "h7"))).toMatchObject({
      value: "3151 mm",
      allowed: "over 0 up to 3150 mm",
    });
  });
});

describe("js by the note of 1988", () => {
  // odd grades over 3 to 6 mm: IT7 12 is even, IT9 30, IT11 75 is odd; over 6 to 10: IT6 9, IT7 15, IT8 22
  it("goes from js7 to js11, and for odd grades only", () => {
    const even = (size: number, text: string): number =>
      isoDeviations(mm(size), text, { jsRounding: "even" }).upperDeviationUm;
    expect([even(8, "js6"), even(8, "js7"), even(8, "js8"), even(5, "js11"), even(8, "k7")]).toEqual([
      4.5, 7, 11, 37, 16,
    ]);
  });
});

describe("the mean", () => {
  it("is exact where the sum of the deviations is even, whatever the nominal", () => {
    const meanOf = (nominal: number, upper: number, lower: number): number =>
      limits({
        nominal: lengthOfTicks(nominal, "mm"),
        upper: lengthOfTicks(upper, "mm"),
        lower: lengthOfTicks(lower, "mm"),
      }).mean.ticks;
    expect([meanOf(0, 2, 0), meanOf(1, 2, 0), meanOf(0, 3, -1), meanOf(1, 4, 0)]).toEqual([1, 2, 1, 3]);
  });
});
