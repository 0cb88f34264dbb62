import {
  attempt,
  convertLimits,
  inch,
  judgeMeasurement,
  limits,
  limitsFromMaxMin,
  notationFaults,
  readCallout,
  roundLength,
  symmetricLimits,
} from "limitsmith";
import type { Limits, Rounding } from "limitsmith";
import { Decimal } from "decimal.js";
import { describe, expect, it } from "vitest";
import { thrown } from "../support/thrown.js";
import { readCases } from "./readCases.js";
import type { Case } from "./readCases.js";

// The cases are copies of what published texts say, or of what their rules give; nothing in them was made by this library.

const file = readCases<unknown, unknown>("conversion.json");

interface Topic {
  readonly topic: string;
  readonly id?: string;
}

function casesOf<Input, Expected>(topic: string): readonly (Case<Input, Expected> & Topic)[] {
  return file.cases.filter((one) => (one as Case<unknown, unknown> & Topic).topic === topic) as (Case<Input, Expected> &
    Topic)[];
}

const Exact = Decimal.clone({ precision: 60, defaults: true });
/** Ticks of 0.1 nm to a millimetre. */
const PER_MM = 10_000_000;

function decimalsOf(fineness: string): number {
  return fineness.split(".")[1]?.length ?? 0;
}

interface Whole {
  readonly unit: "mm" | "in";
  readonly to: "mm" | "in";
  readonly nominal?: string;
  readonly deviation?: string;
  readonly high?: string;
  readonly low?: string;
  readonly places?: number;
}
interface Converted {
  readonly exact?: readonly [string, string];
  readonly total_tolerance?: string;
  readonly places?: number;
  readonly A?: readonly [string, string];
  readonly B?: readonly [string, string];
  readonly A_tolerance?: string;
  readonly B_tolerance?: string;
  readonly largest_excursion_percent?: string;
}

function limitsOf({ unit, nominal = "", deviation = "", high, low }: Whole): Limits {
  if (high !== undefined && low !== undefined) {
    return limitsFromMaxMin({ max: `${high} ${unit}`, min: `${low} ${unit}` });
  }
  return symmetricLimits(`${nominal} ${unit}`, `${deviation} ${unit}`);
}

describe("conversion examples", () => {
  const cases = casesOf<Whole, Converted>("conversion");
  it.each(cases.map((one) => [one.id ?? "", one] as const))("%s", (_id, { input, expected }) => {
    const original = limitsOf(input);
    const { places } = input;
    const as = (method: "A" | "B") =>
      convertLimits(original, input.to, { method, ...(places === undefined ? {} : { places }) });
    if (expected?.exact !== undefined) {
      expect([original.min.ticks, original.max.ticks]).toEqual(
        expected.exact.map((text) => new Exact(text).mul(PER_MM).toNumber()),
      );
    }
    for (const method of ["A", "B"] as const) {
      const sizes = expected?.[method];
      if (sizes === undefined) continue;
      const { limits: got, places: kept } = as(method);
      expect([got.min.ticks, got.max.ticks]).toEqual(
        sizes.map((text) =>
          new Exact(text)
            .mul(input.to === "mm" ? 1 : "25.4")
            .mul(PER_MM)
            .toNumber(),
        ),
      );
      expect(got.max.unit).toBe(input.to);
      if (expected?.places !== undefined) expect(kept).toBe(expected.places);
      const width = expected?.[`${method}_tolerance`];
      if (width !== undefined) expect(got.tolerance.ticks).toBe(new Exact(width).mul(PER_MM).toNumber());
    }
    if (expected?.largest_excursion_percent !== undefined) {
      const { maxShift, minShift } = as("A");
      const percent = new Exact(Math.max(maxShift.ticks, -minShift.ticks)).div(original.tolerance.ticks).mul(100);
      expect(percent.toFixed(2)).toBe(expected.largest_excursion_percent);
    }
  });

  it("nearest passes both limits of 11 ± 0.3 mm, inside passes none", () => {
    const size = symmetricLimits("11 mm", "0.3 mm");
    expect(convertLimits(size, "in", { method: "A", places: 3 })).toMatchObject({ oversteps: true });
    expect(convertLimits(size, "in", { method: "B", places: 3 })).toMatchObject({ oversteps: false });
  });

  it("has every example", () => {
    expect(cases.map(({ id }) => id)).toEqual(["E1", "E2", "E3", "E4", "GT071", "GT073"]);
  });
});

describe("fineness", () => {
  const cases = casesOf<{ total_tolerance: string; unit: "mm" | "in"; to: "mm" | "in" }, { fineness: string }>(
    "fineness",
  );
  it.each(cases.map((one) => [`${one.input.total_tolerance} ${one.input.unit} ${one.why ?? ""}`, one] as const))(
    "%s",
    (_name, { input, expected }) => {
      const deviation = `${input.total_tolerance} ${input.unit}`;
      const given = [
        limits({ nominal: `1000 ${input.unit}`, upper: deviation, lower: `0 ${input.unit}` }),
        limits({ nominal: `1000 ${input.unit}`, upper: `0 ${input.unit}`, lower: `-${deviation}` }),
      ];
      for (const one of given) {
        for (const method of ["A", "B"] as const) {
          if (expected === null) {
            expect(thrown(() => convertLimits(one, input.to, { method })).code).toBe("CONVERSION_NO_FINENESS");
          } else {
            expect(convertLimits(one, input.to, { method }).places).toBe(decimalsOf(expected.fineness));
          }
        }
      }
    },
  );

  it("goes by the total tolerance: not by the nominal, and not by one deviation", () => {
    // .032 in altogether, .001 in on one side
    for (const nominal of ["0 in", "1.95 in", "39 in"]) {
      const size = limits({ nominal, upper: ".031 in", lower: "-.001 in" });
      expect(convertLimits(size, "mm", { method: "A" }).places).toBe(2);
    }
  });
});

describe("the identity of 2 per cent", () => {
  it.each(casesOf<{ smallest_tolerance: string; fineness_mm: string }, { percent: string }>("two per cent"))(
    "$input.smallest_tolerance in",
    ({ input, expected }) => {
      // half the fineness over the smallest tolerance of the row
      const identity = new Exact(input.fineness_mm)
        .div(2)
        .div(new Exact(input.smallest_tolerance).mul("25.4"))
        .mul(100);
      expect(identity.toFixed(2)).toBe(expected?.percent);
      const size = limits({ nominal: "1 in", upper: `${input.smallest_tolerance} in`, lower: "0 in" });
      const { places } = convertLimits(size, "mm", { method: "A" });
      const own = new Exact(10).pow(-places).div(2).mul(PER_MM).div(size.tolerance.ticks).mul(100);
      expect(own.toFixed(2)).toBe(expected?.percent);
    },
  );
});

describe("rounding", () => {
  const cases = casesOf<{ value: string; fineness: string; rounding: Rounding }, { rounded: string }>("rounding");
  it.each(cases)("$input.value to $input.fineness, $input.rounding", ({ input, expected }) => {
    const { value, fineness, rounding } = input;
    // a fineness of ten: tens of µm are hundredths of a millimetre
    const tens = fineness === "10";
    const unit = tens ? "µm" : "mm";
    const options = tens ? { unit: "mm" as const, places: 2, rounding } : { places: decimalsOf(fineness), rounding };
    const ticks = new Exact(expected?.rounded ?? NaN).mul(tens ? 10_000 : PER_MM).toNumber();
    expect(roundLength(`${value} ${unit}`, options).ticks).toBe(ticks);
    // negative numbers: the magnitude is rounded, the sign kept
    expect(roundLength(`-${value} ${unit}`, options).ticks).toBe(-ticks);
  });
});

describe("inch fractions", () => {
  interface Row {
    readonly exact_in: string;
    readonly exact_mm: string;
    readonly "4_place": string;
    readonly "3_place": string;
    readonly "2_place": string;
    readonly half_up?: Readonly<Record<string, string>>;
  }
  const cases = casesOf<{ fraction: string }, Row>("fraction");
  it.each(cases)("$input.fraction", ({ input, expected }) => {
    if (expected === null) throw new Error("a row without values");
    const size = inch(input.fraction);
    const ticks = (text: string): number => new Exact(text.replace(/^\./, "0.")).mul("25.4").mul(PER_MM).toNumber();
    expect(size.ticks).toBe(ticks(expected.exact_in));
    expect(size.ticks).toBe(new Exact(expected.exact_mm).mul(PER_MM).toNumber());
    for (const places of [4, 3, 2] as const) {
      const even = expected[`${places}_place`];
      expect(roundLength(size, { places }).ticks).toBe(ticks(even));
      const away = expected.half_up?.[`${places}_place`] ?? even;
      expect(roundLength(size, { places, rounding: "nearest-away" }).ticks).toBe(ticks(away));
    }
  });

  it("are all 64", () => {
    expect(cases.length).toBe(64);
  });
});

describe("conformity", () => {
  it.each(casesOf<{ max: string; min: string; measured: string }, { inside: boolean }>("conformity"))(
    "$input.measured against $input.min to $input.max",
    ({ input, expected }) => {
      for (const unit of ["mm", "in"]) {
        const size = limitsFromMaxMin({ max: `${input.max} ${unit}`, min: `${input.min} ${unit}` });
        const { verdict } = judgeMeasurement(size, `${input.measured} ${unit}`, { rule: "simple acceptance" });
        expect(verdict).toBe(expected?.inside === true ? "pass" : "fail");
      }
    },
  );
});

describe("decision", () => {
  interface Zone {
    readonly acceptance: readonly [string, string];
    readonly readings: Readonly<Record<string, string>>;
  }
  it.each(casesOf<{ max: string; min: string; U: string; rule: string }, Zone>("decision"))(
    "U = $input.U, $input.rule",
    ({ input, expected }) => {
      if (expected === null) throw new Error("a case without values");
      const size = limitsFromMaxMin({ max: `${input.max} mm`, min: `${input.min} mm` });
      const judge = (reading: string) =>
        judgeMeasurement(size, `${reading} mm`, { rule: "ISO 14253-1:2013", uncertainty: `${input.U} mm` });
      const ticks = (text: string): number => new Exact(text).mul(PER_MM).toNumber();
      const readings = Object.entries(expected.readings);
      expect(readings.length).toBe(2);
      for (const [reading, says] of readings) {
        const { verdict, acceptance, rejection } = judge(reading);
        expect([acceptance?.min.ticks, acceptance?.max.ticks]).toEqual(expected.acceptance.map(ticks));
        if (says === "rejection limit") {
          // outside by U: that much proves it
          expect(rejection.max.ticks).toBe(ticks(reading));
          expect(verdict).toBe("fail");
        } else expect(verdict).toBe(says);
      }
    },
  );
});

describe("notation", () => {
  it.each(casesOf<{ unit: "mm" | "in"; text: string }, { valid: boolean }>("notation"))(
    "$input.text $input.unit",
    ({ input, expected }) => {
      const answer = attempt(() => notationFaults(input.text, { unit: input.unit }));
      // what cannot be read is no valid notation
      expect(answer.ok && answer.value.length === 0).toBe(expected?.valid);
    },
  );

  it.each(casesOf<{ limits: readonly [string, string] }, { text: string }>("one line"))(
    "limits on one line: $expected.text",
    ({ input, expected }) => {
      for (const unit of ["mm", "in"] as const) {
        const request = readCallout(expected?.text ?? "", { unit });
        expect(request.kind === "limits" && [request.max.text, request.min.text]).toEqual(input.limits);
      }
    },
  );
});
