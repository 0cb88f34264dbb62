import { asForce, asStress, asTorque, force, stress, torque } from "limitsmith";
import type { ForceUnit, StressUnit, TorqueUnit } from "limitsmith";
import { Decimal } from "decimal.js";
import { describe, expect, it } from "vitest";
import { codeOf, thrown } from "../support/thrown.js";

// The definitions: pound 0.45359237 kg, standard gravity 9.80665 m/s², inch 0.0254 m, multiplied out exactly.
const LBF_IN_N = new Decimal("0.45359237").times("9.80665");
const PSI_IN_MPA = LBF_IN_N.div("0.0254").div("0.0254").div(1_000_000);
const LBF_IN_IN_NM = LBF_IN_N.times("0.0254");

/** Right to 15 figures: what the doc comment promises. */
function expectClose(given: number, exact: Decimal): void {
  expect(new Decimal(given).minus(exact).abs().div(exact.abs()).toNumber()).toBeLessThan(1e-15);
}

describe("stress", () => {
  it.each([
    [1, "psi", "MPa", PSI_IN_MPA],
    [1, "ksi", "MPa", PSI_IN_MPA.times(1000)],
    [36.5, "ksi", "psi", new Decimal(36_500)],
    [36_500, "psi", "ksi", new Decimal("36.5")],
    [250, "MPa", "psi", new Decimal(250).div(PSI_IN_MPA)],
    [-250, "MPa", "ksi", new Decimal(-250).div(PSI_IN_MPA).div(1000)],
    [250.1, "MPa", "MPa", new Decimal("250.1")],
  ] as const)("%d %s in %s", (value, from, to, exact) => {
    expectClose(stress(value, from).to(to), exact);
  });

  it.each([
    ["250 MPa", 250, "MPa"],
    ["250MPa", 250, "MPa"],
    [" 250  N/mm² ", 250, "MPa"],
    ["250 N/mm2", 250, "MPa"],
    ["36 ksi", 36, "ksi"],
    [".5 psi", 0.5, "psi"],
    ["5. psi", 5, "psi"],
    ["+5 lbf/in²", 5, "psi"],
    ["-5 lbf/in2", -5, "psi"],
    ["\u22125 psi", -5, "psi"],
    ["1e-7 MPa", 1e-7, "MPa"],
    ["2.5E+3 psi", 2500, "psi"],
  ] as const)("reads %j", (text, value, unit) => {
    expect({ ...asStress(text) }).toEqual({ value, unit });
  });

  it.each([
    ["UNIT_MISSING", "250"],
    ["UNIT_UNKNOWN", "250 mPa"],
    ["UNIT_UNKNOWN", "250 Pa"],
    ["UNIT_UNKNOWN", "250 N·m"],
    ["UNIT_UNKNOWN", "250 e5 psi"],
    ["NUMBER_MALFORMED", "30,000 psi"],
    ["NUMBER_MALFORMED", "30 000 psi"],
    ["NUMBER_MALFORMED", "1/2 psi"],
    ["NUMBER_MALFORMED", "1.2.3 psi"],
    ["NUMBER_MALFORMED", "MPa"],
    ["NUMBER_MALFORMED", "NaN psi"],
    ["NUMBER_MALFORMED", "--5 psi"],
    ["NUMBER_NOT_FINITE", "1e999 psi"],
    ["QUANTITY_OUT_OF_RANGE", "1e16 psi"],
    ["TEXT_EMPTY", " "],
    ["TEXT_TOO_LONG", `${"1".repeat(1_000_000)} psi`],
  ] as const)("%s for a text", (code, text) => {
    expect(codeOf(() => asStress(text))).toBe(code);
  });

  it.each([
    [250],
    [null],
    [undefined],
    [{}],
    [{ value: 1 }],
    [{ unit: "psi" }],
    [{ value: "1", unit: "psi" }],
    [Object.create({ value: 1, unit: "psi" })],
  ])("QUANTITY_INVALID for %j", (value) => {
    expect(codeOf(() => asStress(value as never))).toBe("QUANTITY_INVALID");
  });

  it("says where a bad value stands", () => {
    const error = thrown(() => asStress("1 stone", ["allowables", "shear"]));
    expect(error.path).toEqual(["allowables", "shear"]);
    expect(error.allowed).toBe("MPa, psi, ksi");
  });

  it("refuses numbers and units that are none", () => {
    expect(codeOf(() => stress(NaN, "MPa"))).toBe("NUMBER_NOT_FINITE");
    expect(codeOf(() => stress(-Infinity, "MPa"))).toBe("NUMBER_NOT_FINITE");
    expect(codeOf(() => stress(-1.1e15, "MPa"))).toBe("QUANTITY_OUT_OF_RANGE");
    expect(stress(1e15, "MPa").value).toBe(1e15);
    expect(codeOf(() => stress("5 MPa", "MPa"))).toBe("NUMBER_MALFORMED");
    expect(codeOf(() => stress("", "MPa"))).toBe("NUMBER_MALFORMED");
    expect(codeOf(() => stress(null as never, "MPa"))).toBe("NUMBER_MALFORMED");
    expect(codeOf(() => stress(5, "bar" as never))).toBe("UNIT_UNKNOWN");
    expect(codeOf(() => stress(5, "constructor" as never))).toBe("UNIT_UNKNOWN");
    expect(codeOf(() => asStress({ value: 5, unit: "Nm" as never }))).toBe("UNIT_UNKNOWN");
    expect(codeOf(() => stress(5, "MPa").to("Nm" as never))).toBe("UNIT_UNKNOWN");
  });

  it("takes a decimal object, and has no minus zero", () => {
    expect(stress(new Decimal("12.5"), "ksi").value).toBe(12.5);
    expect(Object.is(stress(-0, "ksi").value, 0)).toBe(true);
    expect(codeOf(() => stress(new Decimal(NaN), "ksi"))).toBe("NUMBER_NOT_FINITE");
  });
});

describe("torque", () => {
  it.each([
    [1, "lbf-in", "Nm", LBF_IN_IN_NM],
    [1, "lbf-ft", "Nm", LBF_IN_IN_NM.times(12)],
    [7.3, "lbf-ft", "lbf-in", new Decimal("87.6")],
    [87.6, "lbf-in", "lbf-ft", new Decimal("7.3")],
    [500, "Nm", "lbf-ft", new Decimal(500).div(LBF_IN_IN_NM).div(12)],
    [500, "Nm", "lbf-in", new Decimal(500).div(LBF_IN_IN_NM)],
  ] as const)("%d %s in %s", (value, from, to, exact) => {
    expectClose(torque(value, from).to(to), exact);
  });

  it.each([
    ["80 N·m", "Nm"],
    ["80 N\u22c5m", "Nm"],
    ["80 N m", "Nm"],
    ["80 Nm", "Nm"],
    ["80 lbf·in", "lbf-in"],
    ["80 lbf in", "lbf-in"],
    ["80 lbf-in", "lbf-in"],
    ["80 in·lbf", "lbf-in"],
    ["80 in-lbf", "lbf-in"],
    ["80 lbf·ft", "lbf-ft"],
    ["80 lbf-ft", "lbf-ft"],
    ["80 ft lbf", "lbf-ft"],
  ] as const)("reads %j", (text, unit) => {
    expect({ ...asTorque(text) }).toEqual({ value: 80, unit });
  });

  it.each(["80 mN", "80 N", "80 lb-ft", "80 MPa", "80 N/m"])("UNIT_UNKNOWN for %j", (text) => {
    expect(codeOf(() => asTorque(text))).toBe("UNIT_UNKNOWN");
  });
});

describe("force", () => {
  it("is exact by definition", () => {
    expect(LBF_IN_N.toString()).toBe("4.4482216152605");
    expect(force(1, "lbf").to("N")).toBe(4.4482216152605);
    expectClose(force(300, "N").to("lbf"), new Decimal(300).div(LBF_IN_N));
    expect(force(2.5, "kN").to("N")).toBe(2500);
    expectClose(force(1000, "lbf").to("kN"), LBF_IN_N);
    expect(asForce("12 kN").toString()).toBe("12 kN");
    expect(codeOf(() => asForce("12 kg"))).toBe("UNIT_UNKNOWN");
    expect(codeOf(() => asForce("12 lb"))).toBe("UNIT_UNKNOWN");
  });
});

describe("every quantity", () => {
  const all = [
    ...(["MPa", "psi", "ksi"] satisfies StressUnit[]).map((unit) => ({ made: stress(0.1 + 0.2, unit), as: asStress })),
    ...(["Nm", "lbf-in", "lbf-ft"] satisfies TorqueUnit[]).map((unit) => ({ made: torque(1e-9, unit), as: asTorque })),
    ...(["N", "kN", "lbf"] satisfies ForceUnit[]).map((unit) => ({ made: force(-1e15, unit), as: asForce })),
  ];

  it.each(all)("$made.unit travels as JSON, as a clone and as a copy", ({ made, as }) => {
    expect(Object.isFrozen(made)).toBe(true);
    const ways = [made, structuredClone(made), JSON.parse(JSON.stringify(made)) as string, { ...made }];
    for (const way of ways) {
      const back = as(way as never);
      expect({ ...back }).toEqual({ value: made.value, unit: made.unit });
      expect(back.toString()).toBe(made.toString());
    }
  });

  it("holds nothing but its number and unit", () => {
    expect(Object.keys(stress(1, "psi"))).toEqual(["value", "unit"]);
  });
});
