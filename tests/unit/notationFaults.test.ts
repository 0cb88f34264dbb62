import { notationFaults, readCallout } from "limitsmith";
import type { CalloutOptions, CalloutRequest } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";

const inch: CalloutOptions = { unit: "in" };
const metric: CalloutOptions = { unit: "mm" };
const comma: CalloutOptions = { unit: "mm", decimalMark: "," };

function codes(text: string, options: CalloutOptions): string[] {
  return notationFaults(text, options).map(({ code }) => code);
}

// Rules of ASME Y14.5M-1994, 1.6.1, 1.6.2 and 2.3, as reprinted on textbook, training and course pages; the examples
// behind each rule are those of the reprints or follow from its words.
describe("millimetres", () => {
  it.each<[string, CalloutOptions, string[]]>([
    // a zero before the point below 1 mm (two sources)
    ["0.9", metric, []],
    [".9", metric, ["ZERO_BEFORE_POINT_MISSING"]],
    ["⌀.9", metric, ["ZERO_BEFORE_POINT_MISSING"]],
    [",9", comma, ["ZERO_BEFORE_POINT_MISSING"]],
    // a whole number has neither point nor zero, a decimal no zero at its end (two sources)
    ["12", metric, []],
    ["100", metric, []],
    ["12.0", metric, ["TRAILING_ZERO_NEEDLESS"]],
    ["12.5", metric, []],
    ["12.50", metric, ["TRAILING_ZERO_NEEDLESS"]],
    ["12,50", comma, ["TRAILING_ZERO_NEEDLESS"]],
    ["12,5", comma, []],
    ["R0.50 MAX", metric, ["TRAILING_ZERO_NEEDLESS"]],
    ["0.50 X 45°", metric, ["TRAILING_ZERO_NEEDLESS"]],
    ["C0.5", metric, []],
    [".50", metric, ["ZERO_BEFORE_POINT_MISSING", "TRAILING_ZERO_NEEDLESS"]],
    // equal deviations: the size is not padded (memory)
    ["32 ±0.25", metric, []],
    ["25 ±0.1", metric, []],
    ["25.0 ±0.1", metric, ["TRAILING_ZERO_NEEDLESS"]],
    // the zero stands before the point of a deviation as well
    ["25 ±.1", metric, ["ZERO_BEFORE_POINT_MISSING"]],
    ["32 +.02/0", metric, ["ZERO_BEFORE_POINT_MISSING"]],
    // one-sided: a plain 0 (two sources)
    ["32 0/-0.02", metric, []],
    ["32 +0.02/0", metric, []],
    // unequal: both deviations with the same decimals (two sources)
    ["32 +0.25/-0.10", metric, []],
    ["32 +0.25/-0.1", metric, ["PLACES_DIFFER"]],
    ["32 +0.2/-0.15", metric, ["PLACES_DIFFER"]],
    // limits: padded to the same decimals (two sources)
    ["25.45/25.00", metric, []],
    ["25.45/25", metric, ["PLACES_DIFFER"]],
    ["25.45/25.0", metric, ["PLACES_DIFFER"]],
    ["25,45/25,0", comma, ["PLACES_DIFFER"]],
    ["0.90/0.85", metric, []],
    // classes, fits, basic sizes: the places mean nothing there, and basic sizes are taught both ways
    ["⌀35 k6", metric, []],
    ["35.0 H7/k6", metric, ["TRAILING_ZERO_NEEDLESS"]],
    ["[25]", metric, []],
    ["[25.00]", metric, []],
    // limits behind a class, and a depth
    ["⌀35 H7 (35.025/35.000)", metric, []],
    ["⌀35 H7 (35.025/35)", metric, ["PLACES_DIFFER"]],
    ["⌀5 ↧.8", metric, ["ZERO_BEFORE_POINT_MISSING"]],
    ["⌀5 ↧12.0", metric, ["TRAILING_ZERO_NEEDLESS"]],
    // angles and threads have rules of their own
    ["30°", metric, []],
    ["M8x1.25-6g", metric, []],
    ["M8x1.0", metric, []],
  ])("%s", (text, options, expected) => {
    expect(codes(text, options)).toEqual(expected);
  });

  it("a nil deviation with decimals is a departure: 32 +0.00/-0.02", () => {
    // two sources: the nil deviation is a single 0 without sign
    expect(codes("32 +0.00/-0.02", metric)).not.toEqual([]);
  });
});

describe("inches", () => {
  it.each<[string, CalloutOptions, string[]]>([
    // no zero before the point (two sources)
    [".500", inch, []],
    ["0.500", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    ["⌀0.500 THRU", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    ["1.500", inch, []],
    ["10.500", inch, []],
    ["(0.50)", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    ["R0.03 MAX", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    ["0.03 X 45°", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    ["0.750/0.748", inch, ["ZERO_BEFORE_POINT_NEEDLESS", "ZERO_BEFORE_POINT_NEEDLESS"]],
    // nor before that of a deviation
    [".875 ±0.005", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    // the size has the decimals of its tolerance (one source)
    [".500 ±.005", inch, []],
    [".50 ±.005", inch, ["PLACES_DIFFER"]],
    [".5000 ±.005", inch, ["PLACES_DIFFER"]],
    ["3 ±.005", inch, ["PLACES_DIFFER"]],
    ["3.000 ±.005", inch, []],
    // unequal and one-sided: the size and both deviations, the nil one written out (two sources)
    [".500 +.000/-.005", inch, []],
    [".500 +.005/-.000", inch, []],
    [".500 0/-.005", inch, ["PLACES_DIFFER"]],
    [".500 +.0050/-.001", inch, ["PLACES_DIFFER"]],
    ["1.6250 +.0022/+.0016", inch, []],
    ["1.625 +.0022/+.0016", inch, ["PLACES_DIFFER"]],
    ["1.625\n+.002\n+.001", inch, []],
    ["1.625\n+.002\n+.0010", inch, ["PLACES_DIFFER"]],
    // limits (one source)
    [".750/.748", inch, []],
    [".75/.748", inch, ["PLACES_DIFFER"]],
    ["⌀.7500\n.748", inch, ["PLACES_DIFFER"]],
    // trailing zeros are what an inch size is padded with
    ["2.500", inch, []],
    ["3.0", inch, []],
    ["⌀.500 ↧.75", inch, []],
    ["⌀.500 ↧0.75", inch, ["ZERO_BEFORE_POINT_NEEDLESS"]],
    // fractions have no decimals
    ["7 3/8", inch, []],
    ["7 3/8 ±1/64", inch, []],
    ["1.0625 g6", inch, []],
    ["1.125 LN2", inch, []],
    ["1/2-13 UNC-2A", inch, []],
    ["45°", inch, []],
    // basic sizes: the teaching differs on zeros at the end, so none is a fault
    ["[2.000]", inch, []],
    ["[2]", inch, []],
  ])("%s", (text, options, expected) => {
    expect(codes(text, options)).toEqual(expected);
  });
});

describe("a unit of its own", () => {
  it("a size goes by its own unit, not by the drawing's", () => {
    expect(codes("25.0 mm", inch)).toEqual(["TRAILING_ZERO_NEEDLESS"]);
    expect(codes("0.5 in", metric)).toEqual(["ZERO_BEFORE_POINT_NEEDLESS"]);
    expect(codes("25.4 mm", inch)).toEqual([]);
  });
});

describe("what comes out", () => {
  it("has the number as it stood and what the rule says", () => {
    const [fault] = notationFaults("⌀12.50", metric);
    expect(fault?.value).toBe("12.50");
    expect(fault?.says).not.toBe("");
    const [missing] = notationFaults(".5", metric);
    expect(missing?.says).toContain("0.5");
    const [needless] = notationFaults("0.500", inch);
    expect(needless?.says).toContain(".500");
  });

  it("is frozen", () => {
    const faults = notationFaults(".50", metric);
    expect(faults.length).toBe(2);
    expect(Object.isFrozen(faults)).toBe(true);
    for (const fault of faults) expect(Object.isFrozen(fault)).toBe(true);
  });

  it("is the same for a request, also one that travelled", () => {
    for (const [text, options] of [
      [".50 ±.005", inch],
      ["0.500", inch],
      ["12.50", metric],
      ["25.45/25", metric],
      ["⌀35 k6", metric],
    ] as const) {
      const request = readCallout(text, options);
      const direct = notationFaults(text, options);
      expect(notationFaults(request)).toEqual(direct);
      expect(notationFaults(JSON.parse(JSON.stringify(request)) as CalloutRequest)).toEqual(direct);
      expect(notationFaults(structuredClone(request))).toEqual(direct);
    }
  });

  it("a request with a decimal comma needs no option: it is in its text", () => {
    const request = readCallout("12,50", comma);
    expect(notationFaults(request, { decimalMark: "," }).map(({ code }) => code)).toEqual(["TRAILING_ZERO_NEEDLESS"]);
    expect(notationFaults(request).map(({ code }) => code)).toEqual(["TRAILING_ZERO_NEEDLESS"]);
    expect(notationFaults(readCallout(",5", comma)).map(({ code }) => code)).toEqual(["ZERO_BEFORE_POINT_MISSING"]);
  });
});

describe("notationFaults refuses", () => {
  it("what readCallout refuses, and what is no request", () => {
    expect(codeOf(() => notationFaults("20 500", metric))).toBe("CALLOUT_NOT_UNDERSTOOD");
    expect(codeOf(() => notationFaults("", inch))).toBe("TEXT_EMPTY");
    expect(codeOf(() => notationFaults("2.5"))).toBe("UNIT_MISSING");
    for (const wrong of [null, undefined, 5, {}, { kind: "plain" }]) {
      expect(codeOf(() => notationFaults(wrong as unknown as string, inch))).toBe("CALLOUT_NOT_UNDERSTOOD");
    }
  });
});
