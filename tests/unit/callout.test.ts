import { describe, expect, it } from "vitest";
import { readCallout, resolveCallout } from "limitsmith";
import type { CalloutOptions, CalloutRequest } from "limitsmith";
import { codeOf, thrown } from "../support/thrown.js";

const inch: CalloutOptions = { unit: "in" };
const metric: CalloutOptions = { unit: "mm" };
const titleBlock = { unit: "in", decimals: { 2: "±.01", 3: "±.005" }, fractions: "±1/64", angles: "±1°" } as const;

/** The request in a few words, without text and shape. */
function gist(request: CalloutRequest): string {
  switch (request.kind) {
    case "class":
      return `${request.nominal.text} ${request.toleranceClass}`;
    case "fit":
      return `${request.nominal.text} ${request.fit}`;
    case "deviations":
      return `${request.nominal.text} ${request.upper.toString()} ${request.lower.toString()} ${request.form}`;
    case "limits":
      return `${request.max.text} ${request.min.text}`;
    case "single limit":
      return `${request.size.text} ${request.side}`;
    case "angle":
      return request.angle.toString();
    case "inch class":
      return `${request.nominal.text} ${request.inchClass} ${request.member ?? ""}`;
    case "chamfer":
      return `${request.length.text} ${request.angle.toString()}`;
    case "thread":
      return request.designation;
    default:
      return request.nominal.text;
  }
}

describe("readCallout", () => {
  it.each<[string, CalloutOptions, string, string]>([
    ["⌀40 m6", metric, "class", "40 m6"],
    ["Ø 40 m6", metric, "class", "40 m6"],
    ["25H7", metric, "class", "25 H7"],
    ["25 JS9", metric, "class", "25 JS9"],
    ["1.25 k6", inch, "class", "1.25 k6"],
    ["⌀35 mm k6", inch, "class", "35 k6"],
    ["1 1/4 k6", inch, "class", "1 1/4 k6"],
    ["40 H7/m6", metric, "fit", "40 H7/m6"],
    ["40 H7-m6", metric, "fit", "40 H7/m6"],
    ["40 K5 / h6", metric, "fit", "40 K5/h6"],
    ["1.375 +.0020/+.0014", inch, "deviations", "1.375 0.002 in 0.0014 in two"],
    [".875 +.002/-.004", inch, "deviations", ".875 0.002 in -0.004 in two"],
    [".875 +.002 -.004", inch, "deviations", ".875 0.002 in -0.004 in two"],
    [".875 +.000/\u2212.004", inch, "deviations", ".875 0 in -0.004 in two"],
    ["32 0/-0.02", metric, "deviations", "32 0 mm -0.02 mm two"],
    ["32 +0.02/0", metric, "deviations", "32 0.02 mm 0 mm two"],
    ["32 -0.01/-0.03", metric, "deviations", "32 -0.01 mm -0.03 mm two"],
    ["⌀12 ±0.02", metric, "deviations", "12 0.02 mm -0.02 mm plus-minus"],
    ["12 +/-0.02", metric, "deviations", "12 0.02 mm -0.02 mm plus-minus"],
    ["25 mm ±0.02", inch, "deviations", "25 0.02 mm -0.02 mm plus-minus"],
    ["7 3/8 ±1/64", inch, "deviations", "7 3/8 0.015625 in -0.015625 in plus-minus"],
    ["1.5754/1.5751", inch, "limits", "1.5754 1.5751"],
    ["1.5751/1.5754", inch, "limits", "1.5754 1.5751"],
    ["25.011/25.002", metric, "limits", "25.011 25.002"],
    ["26/24", metric, "limits", "26 24"],
    ["24-26", metric, "limits", "26 24"],
    ["35 f7 (-0.025/-0.050)", metric, "class", "35 f7"],
    [".015 MAX", inch, "single limit", ".015 max"],
    ["5 min", metric, "single limit", "5 min"],
    ["2.188", inch, "plain", "2.188"],
    ["7 3/8", inch, "plain", "7 3/8"],
    ["7-3/8", inch, "plain", "7-3/8"],
    ['5/8"', metric, "plain", "5/8"],
    ["(3.75)", inch, "reference", "3.75"],
    ["( ⌀3.75 )", inch, "reference", "3.75"],
    ["3.75 REF", inch, "reference", "3.75"],
    ["[2.000]", inch, "basic", "2.000"],
    ["2.000 BASIC", inch, "basic", "2.000"],
    ["2.000 BSC", inch, "basic", "2.000"],
    ["45°", inch, "angle", "45°"],
    ["0°30'", inch, "angle", "0°30'"],
    ["12°15'30\"", inch, "angle", "12°15'30\""],
    ["25,4 H7", { unit: "mm", decimalMark: "," }, "class", "25,4 H7"],
    ["22,5°", { unit: "mm", decimalMark: "," }, "angle", "22.5°"],
  ])("%s", (text, options, kind, expected) => {
    const request = readCallout(text, options);
    expect(request.kind).toBe(kind);
    expect(gist(request)).toBe(expected);
    expect(request.text).toBe(text);
    expect(request.shape).toBe(/[⌀Ø]/.test(text) ? "diameter" : "unmarked");
    expect(Object.isFrozen(request)).toBe(true);
  });

  it("limits behind a class stand as sizes or as deviations", () => {
    for (const text of ["35 k6 (35.018/35.002)", "35 k6 (+0.018/+0.002)", "35 k6 (35.002-35.018)"]) {
      const request = readCallout(text, metric);
      if (request.kind !== "class") throw new Error(request.kind);
      expect([request.printed?.max.length.toString(), request.printed?.min.length.toString()]).toEqual([
        "35.018 mm",
        "35.002 mm",
      ]);
    }
  });

  it("keeps the decimals as written", () => {
    const request = readCallout("2.500", inch);
    expect(request.kind === "plain" ? request.nominal.places : -1).toBe(3);
  });

  it.each<[string, CalloutOptions, string, [number, number] | null]>([
    ["", inch, "TEXT_EMPTY", null],
    ["   ", inch, "TEXT_EMPTY", null],
    ["x".repeat(201), inch, "TEXT_TOO_LONG", null],
    ["40 m6 approx", metric, "CALLOUT_NOT_UNDERSTOOD", [6, 12]],
    ["40 m6 40 m6", metric, "CALLOUT_NOT_UNDERSTOOD", [6, 8]],
    ["m6", metric, "CALLOUT_NOT_UNDERSTOOD", [0, 1]],
    ["40 m 6", metric, "CALLOUT_NOT_UNDERSTOOD", [3, 4]],
    ["40 H7/", metric, "CALLOUT_NOT_UNDERSTOOD", [6, 6]],
    ["40 q6", metric, "CLASS_LETTER_UNKNOWN", [3, 5]],
    ["40 m19", metric, "CLASS_GRADE_UNKNOWN", [3, 6]],
    ["(3.75", inch, "CALLOUT_NOT_UNDERSTOOD", [5, 5]],
    ["(3.75]", inch, "CALLOUT_NOT_UNDERSTOOD", [5, 6]],
    ["[2.000 ±.001]", inch, "CALLOUT_NOT_UNDERSTOOD", [7, 8]],
    ["2.000 ±", inch, "CALLOUT_NOT_UNDERSTOOD", [7, 7]],
    ["2.000 ±.001 ±.002", inch, "CALLOUT_TWO_TOLERANCES", [12, 13]],
    ["2.000 +.001", inch, "CALLOUT_NOT_UNDERSTOOD", [11, 11]],
    ["2.000 .001/-.001", inch, "CALLOUT_NOT_UNDERSTOOD", [6, 10]],
    ["1.250 +.001/+.003", inch, "LIMITS_UPSIDE_DOWN", [6, 17]],
    ["2\u0000", inch, "CONTROL_CHARACTER", [1, 2]],
    ["2.188 \u{1F600}", inch, "CALLOUT_NOT_UNDERSTOOD", [6, 7]],
    ["2,188", inch, "DECIMAL_MARK_MIXED", [0, 5]],
    ["1/0", inch, "FRACTION_ZERO_DENOMINATOR", [0, 3]],
    ["1/2", metric, "FRACTION_NOT_INCH", [0, 3]],
    ["2.188", {}, "UNIT_MISSING", [0, 5]],
    ["1.000000001", inch, "LENGTH_TOO_FINE", [0, 11]],
    ["25 mm ±.001 in", metric, "CALLOUT_UNIT_CONFLICT", [0, 14]],
    ["1.5754 in/40.01 mm", inch, "CALLOUT_UNIT_CONFLICT", [0, 18]],
    ["95°70'", inch, "ANGLE_INVALID", [0, 6]],
    ["45° MAX", inch, "CALLOUT_NOT_UNDERSTOOD", [4, 7]],
    ["1.250 ±0", inch, "CALLOUT_ZERO_TOLERANCE", [6, 8]],
    ["1.250/1.250", inch, "CALLOUT_ZERO_TOLERANCE", [0, 11]],
    ["7 3/8 ±0.5 mm", inch, "CALLOUT_UNIT_CONFLICT", [0, 13]],
    ["4x6.5", metric, "CALLOUT_NOT_UNDERSTOOD", [1, 2]],
    ["0X ⌀5", metric, "CALLOUT_NOT_UNDERSTOOD", [0, 1]],
    ["⌀6 THRU ↧5", metric, "CALLOUT_NOT_UNDERSTOOD", [0, 10]],
    ["12 ±0.1 REF", metric, "CALLOUT_NOT_UNDERSTOOD", [8, 11]],
  ])("refuses %j", (text, options, code, position) => {
    const error = thrown(() => readCallout(text, options));
    expect(error.code).toBe(code);
    expect(error.position).toEqual(position === null ? null : { start: position[0], end: position[1] });
  });

  it("refuses what is no text", () => {
    for (const wrong of [null, undefined, 40, {}]) {
      expect(codeOf(() => readCallout(wrong as string, inch))).toBe("CALLOUT_NOT_UNDERSTOOD");
    }
  });
});

describe("resolveCallout", () => {
  it("class, on an inch drawing too", () => {
    const metricSeat = resolveCallout("⌀40 m6", metric);
    // ISO 286-2:2010, m6 over 30 to 50: +25/+9
    expect(metricSeat).toMatchObject({ outcome: "limits", limits: { designation: "m6" } });
    expect(limitsOf(metricSeat)).toBe("40.025 mm 40.009 mm");
    expect(limitsOf(resolveCallout("1.25 k6", inch))).toBe("31.768 mm 31.752 mm");
  });

  it("fit: both members, or the one of the feature", () => {
    expect(resolveCallout("40 H7/m6", metric)).toMatchObject({ outcome: "fit", fit: { kind: "transition" } });
    expect(limitsOf(resolveCallout("40 H7/m6", { ...metric, feature: "hole" }))).toBe("40.025 mm 40 mm");
    const shaft = resolveCallout("40 H7/m6", { ...metric, feature: "shaft" });
    expect(limitsOf(shaft)).toBe("40.025 mm 40.009 mm");
    expect(shaft.outcome === "limits" && shaft.fit?.designation).toBe("H7/m6");
  });

  it("inch fit class: the member that the feature or the text names", () => {
    // ANSI B4.1-1967, LN2 over 1.19 to 1.97 in: hole +1.0/0, shaft +1.6/+1.0 thou
    expect(limitsOf(resolveCallout("1.250 LN2 shaft", inch))).toBe("1.2516 in 1.251 in");
    expect(limitsOf(resolveCallout("1.250 LN2", { ...inch, feature: "shaft" }))).toBe("1.2516 in 1.251 in");
    expect(limitsOf(resolveCallout("1.250 ln 2", { ...inch, feature: "hole" }))).toBe("1.251 in 1.25 in");
    // LT2 over 0.40 to 0.71 in: hole +1.0/0, shaft ±0.35; on a shaft basis all four move by -0.35
    expect(limitsOf(resolveCallout(".625 LT2", { ...inch, feature: "shaft" }))).toBe("0.62535 in 0.62465 in");
    expect(limitsOf(resolveCallout("⌀.625 LT2S hole", inch))).toBe("0.62565 in 0.62465 in");
    expect(resolveCallout("1.250 LN2", inch)).toMatchObject({ outcome: "fit", fit: { kind: "interference" } });
    expect(codeOf(() => resolveCallout("1.250 LN2 hole", { ...inch, feature: "shaft" }))).toBe("CALLOUT_KIND_MISMATCH");
  });

  it("chamfers, angles with deviations, threads and depths", () => {
    const chamfer = resolveCallout(".06 X 30°", { titleBlock });
    expect(chamfer).toMatchObject({ outcome: "chamfer" });
    expect(chamfer.outcome === "chamfer" && [chamfer.limits.max.toString(), chamfer.angle.min.toString()]).toEqual([
      "0.07 in",
      "29°",
    ]);
    const own = resolveCallout("30° +1°/-0°30'", inch);
    expect(own.outcome === "angle" && [own.angle.max.toString(), own.angle.min.toString()]).toEqual(["31°", "29.5°"]);
    expect(resolveCallout("1/4-20 UNC-2B THRU", { titleBlock })).toMatchObject({ outcome: "no limits", depth: null });
    expect(resolveCallout("1/4-20 UNC-2B ↧.62", { titleBlock }).depth?.min.toString()).toBe("0.61 in");
    expect(codeOf(() => resolveCallout("⌀.25 ±.01 ↧.62", inch))).toBe("TITLE_BLOCK_MISSING");
  });

  it("own tolerances", () => {
    expect(limitsOf(resolveCallout("1.375 +.0020/+.0014", inch))).toBe("1.377 in 1.3764 in");
    expect(limitsOf(resolveCallout("⌀12 ±0.02", metric))).toBe("12.02 mm 11.98 mm");
    expect(limitsOf(resolveCallout("1.5751/1.5754", inch))).toBe("1.5754 in 1.5751 in");
    const single = resolveCallout(".015 MAX", inch);
    expect(single.outcome === "single limit" && `${single.single.kind} ${single.single.limit.toString()}`).toBe(
      "max 0.015 in",
    );
  });

  it("the title block, whose unit and decimal mark count", () => {
    expect(limitsOf(resolveCallout("2.188", { titleBlock }))).toBe("2.193 in 2.183 in");
    expect(limitsOf(resolveCallout("7 3/8", { titleBlock }))).toBe("7.390625 in 7.359375 in");
    const comma = { unit: "mm", decimalMark: ",", decimals: { 1: "±0,2" } } as const;
    expect(limitsOf(resolveCallout("12,5", { titleBlock: comma }))).toBe("12.7 mm 12.3 mm");
    const angle = resolveCallout("45°", { titleBlock });
    expect(angle.outcome === "angle" && angle.angle.max.toString()).toBe("46°");
  });

  it("no default for reference and basic dimensions", () => {
    for (const text of ["(3.75)", "3.75 REF", "[2.000]", "2.000 BASIC"]) {
      expect(resolveCallout(text, { titleBlock }).outcome).toBe("no limits");
    }
  });

  it.each([
    ["40 m6", { ...metric, feature: "hole" }, "CALLOUT_KIND_MISMATCH"],
    ["40 M6", { ...metric, feature: "shaft" }, "CALLOUT_KIND_MISMATCH"],
    ["2.188", inch, "TITLE_BLOCK_MISSING"],
    ["45°", inch, "TITLE_BLOCK_MISSING"],
    ["2.1880", { titleBlock }, "TITLE_BLOCK_NO_LINE"],
    ["25 mm", { titleBlock }, "TITLE_BLOCK_NOT_APPLICABLE"],
    ["20 mm t7", { titleBlock }, "ISO_DEVIATION_NOT_DEFINED"],
  ] as const)("refuses %s", (text, context, code) => {
    expect(codeOf(() => resolveCallout(text, context))).toBe(code);
  });

  it("takes a request, also one that travelled", () => {
    for (const text of [
      "⌀1.25 k6",
      "1.25 H7/k6",
      "1.25 +.001/-.002",
      "1.251/1.250",
      ".015 MAX",
      "2.188",
      "45°",
      "(2.1)",
    ]) {
      const request = readCallout(text, inch);
      const direct = JSON.stringify(resolveCallout(text, { titleBlock }));
      const sent = JSON.parse(JSON.stringify(request)) as CalloutRequest;
      expect(JSON.stringify(resolveCallout(structuredClone(request), { titleBlock }))).toBe(direct);
      expect(JSON.stringify(resolveCallout(sent, { titleBlock }))).toBe(direct);
    }
    expect(codeOf(() => resolveCallout({ kind: "guess" } as unknown as CalloutRequest, inch))).toBe(
      "CALLOUT_NOT_UNDERSTOOD",
    );
  });
});

function limitsOf(resolved: ReturnType<typeof resolveCallout>): string {
  return resolved.outcome === "limits"
    ? `${resolved.limits.max.toString()} ${resolved.limits.min.toString()}`
    : resolved.outcome;
}
