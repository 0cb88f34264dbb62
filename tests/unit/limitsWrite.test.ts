import { inch, limits, limitsFromMaxMin, mm, symmetricLimits, thou, um, writeLimits } from "limitsmith";
import type { Limits, LimitsForm, WriteLimitsStyle } from "limitsmith";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";

const SEAT = limits({ nominal: mm(32), upper: um(18), lower: um(2), designation: "k6" });
const BORE = limits({ nominal: mm(32), upper: um(25), lower: um(0), designation: "H7" });
const SPIGOT = limits({ nominal: mm(32), upper: um(0), lower: um(-16), designation: "h6" });
const CLEAR = limits({ nominal: mm(32), upper: um(-9), lower: um(-25), designation: "g6" });
const PLATE = symmetricLimits(inch("2.188"), thou(5));
const KEYSEAT = limits({ nominal: inch(".875"), upper: thou(2), lower: thou(-4) });
const JOURNAL = limits({ nominal: inch("1.5"), upper: thou(0), lower: thou("-0.6"), designation: "RC3" });

describe("writeLimits", () => {
  it.each<[string, Limits, WriteLimitsStyle, string]>([
    // metric: a zero before the point, deviations with the same decimals, a plain 0
    ["both above", SEAT, { form: "deviations" }, "32 +0.018/+0.002"],
    ["zero below", BORE, { form: "deviations" }, "32 +0.025/0"],
    ["zero above", SPIGOT, { form: "deviations" }, "32 0/-0.016"],
    ["both below", CLEAR, { form: "deviations" }, "32 -0.009/-0.025"],
    ["aligned", limits({ nominal: mm(5), upper: um(20), lower: um(-9) }), { form: "deviations" }, "5 +0.020/-0.009"],
    [
      "whole and tenths",
      limits({ nominal: mm(5), upper: mm(1), lower: mm("-0.5") }),
      { form: "deviations" },
      "5 +1.0/-0.5",
    ],
    [
      "decimals of the nominal",
      limits({ nominal: mm("12.70"), upper: um(50), lower: um(0) }),
      { form: "deviations" },
      "12.7 +0.05/0",
    ],
    ["max first", SEAT, { form: "limits" }, "32.018/32.002"],
    ["max and nominal", BORE, { form: "limits" }, "32.025/32.000"],
    ["±", symmetricLimits(mm(12), um(20)), { form: "plus-minus" }, "12 ±0.02"],
    ["class", SEAT, { form: "class" }, "32 k6 (32.018/32.002)"],
    ["no tolerance", symmetricLimits(mm(12), um(0)), { form: "plus-minus" }, "12 ±0"],
    // inch: no zero before the point, the same decimals everywhere, signed zeros
    ["inch deviations", KEYSEAT, { form: "deviations" }, ".875 +.002/-.004"],
    ["inch zero above", JOURNAL, { form: "deviations" }, "1.5000 +.0000/-.0006"],
    [
      "inch zero below",
      limits({ nominal: inch(".75"), upper: thou(3), lower: thou(0) }),
      { form: "deviations" },
      ".750 +.003/-.000",
    ],
    ["inch limits", KEYSEAT, { form: "limits" }, ".877/.871"],
    ["inch ±", PLATE, { form: "plus-minus" }, "2.188 ±.005"],
    ["inch class", JOURNAL, { form: "class" }, "1.5000 RC3 (1.5000/1.4994)"],
    ["inch with more places", PLATE, { form: "limits", places: 4 }, "2.1930/2.1830"],
    // one system on a drawing of the other
    ["metric class in inches", SEAT, { form: "limits", unit: "in", places: 4 }, "1.2605/1.2600"],
    ["inch in mm, exactly", PLATE, { form: "limits", unit: "mm" }, "55.7022/55.4482"],
    ["µm", SEAT, { form: "limits", unit: "um" }, "32018/32002"],
    // looks
    ["metric numbers in inches", KEYSEAT, { form: "deviations", numbers: "metric" }, "0.875 +0.002/-0.004"],
    ["inch numbers in mm", SEAT, { form: "deviations", numbers: "inch" }, "32.000 +.018/+.002"],
    ["decimal comma", SEAT, { form: "deviations", decimalMark: "," }, "32 +0,018/+0,002"],
    [
      "decimal comma, aligned",
      limits({ nominal: mm(5), upper: um(20), lower: um(-9) }),
      { form: "deviations", decimalMark: "," },
      "5 +0,020/-0,009",
    ],
    [
      "decimal comma, whole max",
      limits({ nominal: mm(5), upper: mm(1), lower: mm("-0.5") }),
      { form: "deviations", decimalMark: "," },
      "5 +1,0/-0,5",
    ],
    [
      "decimal comma, whole min",
      limitsFromMaxMin({ max: mm("32.1"), min: mm(32) }),
      { form: "limits", decimalMark: "," },
      "32,1/32,0",
    ],
    ["decimal comma in inches", KEYSEAT, { form: "limits", decimalMark: "," }, ",877/,871"],
    // the finest that a tick can hold
    [
      "1/128 in",
      limits({ nominal: inch("1/128"), upper: inch(0), lower: inch(0) }),
      { form: "limits" },
      ".0078125/.0078125",
    ],
    [
      "half a µin",
      limits({ nominal: inch(1), upper: "0.5 uin", lower: "0 in" }),
      { form: "limits", unit: "thou" },
      "1000.0005/1000.0000",
    ],
  ])("%s", (_, given, style, text) => {
    const written = writeLimits(given, style);
    expect(written.text).toBe(text);
    expect(Object.isFrozen(written) && Object.isFrozen(written.lines)).toBe(true);
    if (style.places === undefined) {
      expect(written).toMatchObject({ exact: true, note: null, rounding: "inside" });
      expect([written.maxShift.ticks, written.minShift.ticks]).toEqual([0, 0]);
    }
  });

  it("stacks lines as a drawing does", () => {
    expect(writeLimits(SEAT, { form: "limits" }).lines).toEqual(["32.018", "32.002"]);
    expect(writeLimits(SEAT, { form: "deviations" }).lines).toEqual(["+0.018", "32 +0.002"]);
    expect(writeLimits(PLATE, { form: "plus-minus" }).lines).toEqual(["2.188 ±.005"]);
    expect(writeLimits(SEAT, { form: "class" }).lines).toEqual(["32 k6 (32.018/32.002)"]);
  });

  describe("rounding", () => {
    // 32.018 mm = 1.260551… in, 32.002 mm = 1.259921… in
    it.each([
      ["inside", "1.2605/1.2600", -1, 1],
      ["outside", "1.2606/1.2599", 1, -1],
      ["nearest", "1.2606/1.2599", 1, -1],
    ] as const)("%s", (rounding, text, maxSign, minSign) => {
      const written = writeLimits(SEAT, { form: "limits", unit: "in", places: 4, rounding });
      expect(written.text).toBe(text);
      expect(written.exact).toBe(false);
      expect(written.rounding).toBe(rounding);
      expect(Math.sign(written.maxShift.ticks)).toBe(maxSign);
      expect(Math.sign(written.minShift.ticks)).toBe(minSign);
      expect(written.note).toContain(`rounded ${rounding} to 4 decimals of in`);
    });

    it("is inside where nothing is said, and says what it cost", () => {
      const written = writeLimits(SEAT, { form: "limits", unit: "in", places: 4 });
      // 32.018 mm is 1260551.18 µin, 32.002 mm is 1259921.26 µin
      expect(written.note).toBe("rounded inside to 4 decimals of in: max lowered by 51.2 µin, min raised by 78.7 µin");
    });

    it("says which limit stayed as it was", () => {
      const written = writeLimits(BORE, { form: "limits", places: 2 });
      expect(written.text).toBe("32.02/32.00");
      expect(written.note).toBe("rounded inside to 2 decimals of mm: max lowered by 5 µm, min unchanged");
    });

    it("rounds deviations from the nominal as it stands on the drawing", () => {
      // 1.26 in would be 32.004 mm: the sum of nominal and deviation is what must stay inside
      const written = writeLimits(SEAT, { form: "deviations", unit: "in", places: 4 });
      expect(written.text).toBe("1.2598 +.0007/+.0002");
      expect(writeLimits(SEAT, { form: "deviations", unit: "in", places: 4, rounding: "outside" }).text).toBe(
        "1.2598 +.0008/+.0001",
      );
    });

    it("takes the smaller value for ± inside and the larger one outside", () => {
      const plate = symmetricLimits(mm(32), um(20));
      // 32 mm = 1.259843 in is written 1.2598; the limits are 1.260630 and 1.259055
      expect(writeLimits(plate, { form: "plus-minus", unit: "in", places: 4 }).text).toBe("1.2598 ±.0007");
      expect(writeLimits(plate, { form: "plus-minus", unit: "in", places: 4, rounding: "outside" }).text).toBe(
        "1.2598 ±.0009",
      );
    });

    it("refuses to round a tolerance away", () => {
      const fine = limits({ nominal: mm("32.0004"), upper: um("0.2"), lower: um("-0.2") });
      expect(codeOf(() => writeLimits(fine, { form: "limits", places: 3 }))).toBe("ROUNDING_COLLAPSES");
      expect(codeOf(() => writeLimits(fine, { form: "deviations", places: 3 }))).toBe("ROUNDING_COLLAPSES");
      expect(codeOf(() => writeLimits(fine, { form: "plus-minus", places: 3 }))).toBe("ROUNDING_COLLAPSES");
      expect(writeLimits(fine, { form: "limits", places: 3, rounding: "outside" }).text).toBe("32.001/32.000");
      expect(writeLimits(fine, { form: "limits", places: 3, rounding: "nearest" }).text).toBe("32.001/32.000");
    });

    it("never shows a negative zero in metric", () => {
      const nearly = limits({ nominal: mm(32), upper: um("0.4"), lower: um("-0.4") });
      for (const form of ["deviations", "plus-minus", "limits"] as const) {
        for (const rounding of ["inside", "outside", "nearest"] as const) {
          const { text } = writeLimits(nearly, { form, places: 3, rounding });
          expect(text).not.toMatch(/-0(?![.,]\d*[1-9])/);
        }
      }
      expect(writeLimits(nearly, { form: "deviations", places: 3 }).text).toBe("32 0/0");
    });
  });

  it.each<[string, Limits, unknown]>([
    ["OPTION_INVALID", SEAT, undefined],
    ["OPTION_INVALID", SEAT, {}],
    ["OPTION_INVALID", SEAT, { form: "max-min" }],
    ["OPTION_INVALID", SEAT, { form: "limits", rounding: "up" }],
    ["OPTION_INVALID", SEAT, { form: "limits", places: -1 }],
    ["OPTION_INVALID", SEAT, { form: "limits", places: 8 }],
    ["OPTION_INVALID", SEAT, { form: "limits", unit: "in", places: 7 }],
    ["OPTION_INVALID", SEAT, { form: "limits", places: 2.5 }],
    ["OPTION_INVALID", SEAT, { form: "limits", numbers: "plain" }],
    ["OPTION_INVALID", SEAT, { form: "limits", decimalMark: "" }],
    ["UNIT_UNKNOWN", SEAT, { form: "limits", unit: "m" }],
    ["UNIT_UNKNOWN", SEAT, { form: "limits", unit: "m", places: 3 }],
    ["LENGTH_NOT_EXACT", SEAT, { form: "limits", unit: "in" }],
    ["LIMITS_NOT_SYMMETRIC", SEAT, { form: "plus-minus" }],
    ["LIMITS_NOT_SYMMETRIC", BORE, { form: "plus-minus" }],
    ["LIMITS_NO_DESIGNATION", PLATE, { form: "class" }],
    ["LIMITS_INVALID", null as never, { form: "limits" }],
  ])("refuses with %s (%#)", (code, given, style) => {
    expect(codeOf(() => writeLimits(given, style as { form: LimitsForm }))).toBe(code);
  });
});
