import { attempt, readCallout, writeCallout } from "limitsmith";
import type { CalloutOptions, CalloutRequest, CalloutStyle } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";

const INCH: CalloutStyle = { numbers: "inch" };
const METRIC: CalloutStyle = { numbers: "metric" };
const inch: CalloutOptions = { unit: "in" };
const mm: CalloutOptions = { unit: "mm" };

function written(text: string, options: CalloutOptions, style: CalloutStyle): string {
  return writeCallout(readCallout(text, options), style);
}

/** What a request says, without how and where it was written. */
function meaning(request: CalloutRequest): string {
  return JSON.stringify(request, (key, value: unknown) => (key === "text" || key === "parts" ? undefined : value));
}

// ASME Y14.5M-1994, 1.6.1, 1.6.2 and 2.3, as reprinted: inch has no zero before the point and writes the nil deviation
// out with its sign; millimetres have the zero, and a plain 0
describe("the two styles", () => {
  it.each<[string, CalloutOptions, string, string]>([
    ["0.875", inch, ".875", "0.875"],
    [".875", inch, ".875", "0.875"],
    ["⌀ .875", inch, "⌀.875", "⌀0.875"],
    ["2.500", inch, "2.500", "2.500"],
    ["12", mm, "12", "12"],
    ["12.50", mm, "12.50", "12.50"],
    [".875 ±.005", inch, ".875 ±.005", "0.875 ±0.005"],
    [".875 +/- .005", inch, ".875 ±.005", "0.875 ±0.005"],
    [".875 +.002 -.004", inch, ".875 +.002/-.004", "0.875 +0.002/-0.004"],
    [".500 0/-.005", inch, ".500 +.000/-.005", "0.500 0/-0.005"],
    [".500 +0/-.005", inch, ".500 +.000/-.005", "0.500 0/-0.005"],
    [".500 +.005 0", inch, ".500 +.005/-.000", "0.500 +0.005/0"],
    [".500 +.005/+0", inch, ".500 +.005/-.000", "0.500 +0.005/0"],
    ["1.6250 +.0022/+.0016", inch, "1.6250 +.0022/+.0016", "1.6250 +0.0022/+0.0016"],
    ["32 -0.00/-0.02", mm, "32 +.00/-.02", "32 0/-0.02"],
    // metric, unequal: both deviations with the same decimals
    ["32 +0.25/-0.1", mm, "32 +.25/-.10", "32 +0.25/-0.10"],
    ["32 -0.01 -0.03", mm, "32 -.01/-.03", "32 -0.01/-0.03"],
    // inch: the deviations have the decimals of the size
    ["1.250 +.01/-.005", inch, "1.250 +.010/-.005", "1.250 +0.010/-0.005"],
    [".753/.750", inch, ".753/.750", "0.753/0.750"],
    [".750/.753", inch, ".753/.750", "0.753/0.750"],
    ["25.00\n25.05", mm, "25.05/25.00", "25.05/25.00"],
    ["r.015 max", inch, "R.015 MAX", "R0.015 MAX"],
    ["5 min", mm, "5 MIN", "5 MIN"],
    ["5.44 ref", inch, "(5.44)", "(5.44)"],
    ["0.44 REF", inch, "(.44)", "(0.44)"],
    ["3.125 BSC", inch, "[3.125]", "[3.125]"],
    ["⌀35k6", mm, "⌀35 k6", "⌀35 k6"],
    ["35 H7-k6", mm, "35 H7/k6", "35 H7/k6"],
    ["35 k6 (35.002/35.018)", mm, "35 k6 (35.018/35.002)", "35 k6 (35.018/35.002)"],
    ["1.125 ln 2 shaft", inch, "1.125 LN2 SHAFT", "1.125 LN2 SHAFT"],
    ["45° x .02", inch, ".02 X 45°", "0.02 X 45°"],
    ["C0.5", mm, ".5 X 45°", "0.5 X 45°"],
    ["45 deg", inch, "45°", "45°"],
    ["0°30'", inch, "0°30'", "0°30'"],
    ["30°±1°", inch, "30° ±1°", "30° ±1°"],
    ["7-3/8", inch, "7 3/8", "7 3/8"],
    ["M8x1.25-6g", mm, "M8x1.25-6g", "M8x1.25-6g"],
    ["1/2-13 UNC-2A", inch, "1/2-13 UNC-2A", "1/2-13 UNC-2A"],
    ["Ø.25", inch, "⌀.25", "⌀0.25"],
    [".25 DIA", inch, "⌀.25", "⌀0.25"],
    ["S Ø.25", inch, "S⌀.25", "S⌀0.25"],
    ["SR.25", inch, "SR.25", "SR0.25"],
  ])("%j", (text, options, inInch, inMetric) => {
    expect(written(text, options, INCH)).toBe(inInch);
    expect(written(text, options, METRIC)).toBe(inMetric);
  });

  it("a decimal comma in every number", () => {
    const comma: CalloutStyle = { numbers: "metric", decimalMark: "," };
    expect(written("32 +0.25/-0.1", mm, comma)).toBe("32 +0,25/-0,10");
    expect(written("35 k6 (35.018/35.002)", mm, comma)).toBe("35 k6 (35,018/35,002)");
    expect(written("0.5x22.5°", mm, comma)).toBe("0,5 X 22,5°");
    expect(written("22.5° ±0.5°", mm, comma)).toBe("22,5° ±0,5°");
    expect(written("12,5", { unit: "mm", decimalMark: "," }, METRIC)).toBe("12.5");
    expect(written("12.7 [.500]", mm, comma)).toContain(",500");
  });

  it("count first, the rest behind, each once", () => {
    const text = written("0.281 DIA +0.004 -0.001 x 0.75 deep 4 places typ", inch, INCH);
    expect(text.startsWith("4X ⌀.281 +.004/-.001 ")).toBe(true);
    for (const piece of ["↧.75", "TYP"]) expect(text.split(piece).length).toBe(2);
    expect(text).not.toMatch(/PLACES|DIA|DEEP/);
    expect(written("2x Ø 0.875 +0.002 0 DEPTH 1.50", inch, INCH)).toBe("2X ⌀.875 +.002/-.000 ↧1.50");
    expect(written("⌀6.6 thru", mm, METRIC)).toBe("⌀6.6 THRU");
  });

  it("a unit only where the drafter wrote one", () => {
    expect(written("⌀35 mm k6", inch, METRIC)).toBe("⌀35 mm k6");
    expect(written("25mm ±0.02", inch, METRIC)).toBe("25 mm ±0.02");
    expect(written("35 k6", mm, METRIC)).toBe("35 k6");
    // the style is one of numbers, not of units: nothing is converted
    expect(written("12.7", mm, INCH)).toBe("12.7");
  });

  it("the decimals stay as they were written: a title block goes by them", () => {
    for (const text of ["2.5", "2.50", "2.500"]) {
      expect(written(text, inch, INCH)).toBe(text);
      expect(written(text, inch, METRIC)).toBe(text);
    }
  });
});

describe("reading back", () => {
  const styles: readonly CalloutStyle[] = [
    INCH,
    METRIC,
    { ...INCH, decimalMark: "," },
    { ...METRIC, decimalMark: "," },
  ];

  it.each<[string, CalloutOptions]>([
    ["7 3/8 ±1/64", inch],
    ["14 3/8 +1/32 -1/64", inch],
    ["⌀35 mm k6", inch],
    ['1 1/2" ±.01"', inch],
    ["20 µm ±1", mm],
    ["500 thou ±1 thou", inch],
    ["0°30' ±0°10'", inch],
    ["12°15'30\"", inch],
    ["45° +1°/-0°30'", inch],
    [".06 +.02/-.00 X 45°", inch],
    ["2X 1.5 ±0.1 X 30° TYP", mm],
    ["⌀1/4 X 1 1/8 DEEP", inch],
    ["2X ⌀.500 RC2 HOLE ↧.75", inch],
    ["3/8 [9.525]", inch],
    ["1.000/.998 [25.40/25.35]", inch],
    ["35 k6 (35.018/35.002) [1.3786/1.3781]", mm],
    ["(2X .50)", inch],
    ["[⌀2.000] TYP", inch],
    ["4X 1/4-20 UNC-2B ↧.50", inch],
    ["4X M8x1.25-6H THRU", mm],
    [".753/.75", inch],
    ["0.0000001 ±0.0000001", mm],
    ["100000 ±1", mm],
  ])("%j gives the same request in every style", (text, options) => {
    const first = readCallout(text, options);
    for (const style of styles) {
      const back = writeCallout(first, style);
      const again = attempt(() => readCallout(back, { ...options, decimalMark: style.decimalMark ?? "." }));
      expect(again.ok ? meaning(again.value) : `${back}: ${again.error.code}`).toBe(meaning(first));
    }
  });
});

describe("a request that travelled", () => {
  it.each<[string, CalloutOptions]>([
    ["2X ⌀.281 +.004 -.001 ↧.75", inch],
    ["35 k6 (35.018/35.002)", mm],
    ["45° +1°/-0°30'", inch],
    [".06 ±.01 X 45°", inch],
    ["25.002/25.011 [.9843/.9847]", mm],
    ["1.125 LN2 SHAFT", inch],
  ])("%j", (text, options) => {
    const request = readCallout(text, options);
    for (const style of [INCH, METRIC]) {
      const direct = writeCallout(request, style);
      expect(writeCallout(structuredClone(request), style)).toBe(direct);
      expect(writeCallout(JSON.parse(JSON.stringify(request)) as CalloutRequest, style)).toBe(direct);
    }
  });
});

describe("writeCallout refuses", () => {
  const plain = readCallout("2.500", inch);

  it.each<[string, unknown]>([
    ["no style", undefined],
    ["null", null],
    ["no numbers", {}],
    ["another style", { numbers: "din" }],
    ["capitals", { numbers: "INCH" }],
    ["another decimal mark", { numbers: "inch", decimalMark: ";" }],
    ["a decimal mark that is no text", { numbers: "inch", decimalMark: 0 }],
  ])("%s", (_name, style) => {
    expect(codeOf(() => writeCallout(plain, style as CalloutStyle))).toBe("OPTION_INVALID");
  });

  it.each<[string, unknown]>([
    ["null", null],
    ["nothing", undefined],
    ["a text", "2.500"],
    ["an empty object", {}],
    ["another kind", { ...plain, kind: "guess" }],
    ["the name of an own key of every object", { ...plain, kind: "constructor" }],
    ["no nominal", { ...plain, nominal: undefined }],
    ["a nominal that is no size", { ...plain, nominal: 2.5 }],
    ["another shape", { ...plain, shape: "star" }],
    ["half a count", { ...plain, count: 2.5 }],
    ["a count of none", { ...plain, count: 0 }],
    ["a negative count", { ...plain, count: -2 }],
    ["a count as a text", { ...plain, count: "2" }],
    ["a count that is no number", { ...plain, count: NaN }],
    ["a depth that is no size", { ...plain, depth: "0.5" }],
    ["a class that is none", { ...readCallout("35 k6", mm), toleranceClass: "" }],
    ["a class with a tail", { ...readCallout("35 k6", mm), toleranceClass: "k6 THRU" }],
    ["a fit that is none", { ...readCallout("35 H7/k6", mm), fit: "H7" }],
    ["a side that is none", { ...readCallout("5 MAX", mm), side: "typ" }],
    ["a member that is none", { ...readCallout("1.125 LN2 SHAFT", inch), member: "key" }],
    ["a form that is none", { ...readCallout("16 ±0.1", mm), form: "three" }],
    ["deviations upside down", { ...readCallout("16 +0.2/-0.1", mm), upper: "-0.2 mm" }],
    ["a designation that is no text", { ...readCallout("M8", mm), designation: 8 }],
  ])("%s", (_name, request) => {
    const code = attempt(() => writeCallout(request as CalloutRequest, INCH));
    // a value inside a request can be refused for what it is; a text made of it never comes out
    expect(code.ok ? code.value : code.error.code).toMatch(
      /^(?:CALLOUT_NOT_UNDERSTOOD|LIMITS_UPSIDE_DOWN|LENGTH_INVALID|CLASS_MALFORMED|FIT_MALFORMED)$/,
    );
  });
});
