import {
  add,
  angleOfMicroarcseconds,
  asLength,
  compareLengths,
  equalLengths,
  exactPlaces,
  inch,
  lengthOfTicks,
  microinch,
  mm,
  multiply,
  readAngle,
  readDimension,
  readLength,
  roundLength,
  subtract,
  thou,
  toDecimal,
  um,
  writeAngle,
  writeLength,
} from "limitsmith";
import type { LengthUnit } from "limitsmith";
import { Decimal } from "decimal.js";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { codeOf } from "../support/thrown.js";
import { anyText, Exact, length, rounding, ROUNDINGS, smallLength, ticks, TICKS, unit } from "./arbitraries.js";

const MAKERS = { mm, um, in: inch, thou, uin: microinch } as const;
const SYMBOLS: Readonly<Record<LengthUnit, string>> = { mm: "mm", um: "µm", in: "in", thou: "thou", uin: "µin" };
const RUNS = { numRuns: 1000 };

function exactIn(value: number, in_: LengthUnit): Decimal {
  return new Exact(value).div(TICKS[in_]);
}

describe("a length comes back as it went", () => {
  it("through its own text and through JSON", () => {
    fc.assert(
      fc.property(length, (one) => {
        expect(readLength(one.toString()).ticks).toBe(one.ticks);
        const sent = JSON.parse(JSON.stringify({ one })) as { one: string };
        expect(asLength(sent.one).ticks).toBe(one.ticks);
        expect(asLength(structuredClone(one))).toEqual(one);
        // the unit comes back too where decimals end in it
        if (exactPlaces(one, one.unit) !== null) expect(asLength(sent.one).unit).toBe(one.unit);
      }),
      RUNS,
    );
  });

  it("through writeLength in every unit where its decimals end, in either style, with either mark", () => {
    fc.assert(
      fc.property(
        length,
        unit,
        fc.constantFrom("metric" as const, "inch" as const),
        fc.constantFrom("." as const, "," as const),
        (one, in_, style, decimalMark) => {
          if (exactPlaces(one, in_) === null) {
            expect(codeOf(() => writeLength(one, { unit: in_ }))).toBe("LENGTH_NOT_EXACT");
            return;
          }
          const text = writeLength(one, { unit: in_, style, decimalMark });
          expect(readLength(text, { decimalMark }).ticks).toBe(one.ticks);
          const bare = writeLength(one, { unit: in_, style, decimalMark, symbol: false, sign: "always" });
          expect(MAKERS[in_](bare, { decimalMark }).ticks).toBe(one.ticks);
          expect(readDimension(bare, { unit: in_, decimalMark }).length.ticks).toBe(one.ticks);
        },
      ),
      RUNS,
    );
  });

  it("exactPlaces is the fewest places that are exact", () => {
    fc.assert(
      fc.property(ticks, unit, (value, in_) => {
        const exact = exactIn(value, in_);
        const places = exactPlaces(lengthOfTicks(value, "mm"), in_);
        // 120 digits hold any value that ends; one that does not fills them
        const wanted = exact.decimalPlaces();
        expect(places).toBe(wanted > 12 ? null : wanted);
      }),
      RUNS,
    );
  });

  it("as the nearest double", () => {
    fc.assert(
      fc.property(length, unit, (one, in_) => {
        expect(one.to(in_)).toBe(exactIn(one.ticks, in_).toNumber());
        // a double holds 15 figures: beyond them a tick can be lost on the way back
        if (Math.abs(one.ticks) < 1e14) expect(MAKERS[in_](one.to(in_)).ticks).toBe(one.ticks);
      }),
      RUNS,
    );
  });

  it("as a decimal, of our own or of the caller's", () => {
    fc.assert(
      fc.property(length, unit, (one, in_) => {
        const decimal = toDecimal(one, in_);
        expect(decimal.toFixed()).toBe(
          exactIn(one.ticks, in_).toSignificantDigits(40, Decimal.ROUND_HALF_UP).toFixed(),
        );
        if (exactPlaces(one, in_) === null) return;
        expect(MAKERS[in_](decimal).ticks).toBe(one.ticks);
        expect(MAKERS[in_](exactIn(one.ticks, in_)).ticks).toBe(one.ticks);
      }),
      RUNS,
    );
  });
});

describe("numbers become the nearest tick", () => {
  it("of any double in range, exactly as its value says", () => {
    fc.assert(
      fc.property(fc.double({ noNaN: true, min: -4000, max: 4000 }), unit, (value, in_) => {
        const exact = new Exact(value).mul(TICKS[in_]);
        const { ticks: made } = MAKERS[in_](value);
        // the double's own spacing is far below a tick here, and so is what the product can lose
        expect(
          exact
            .sub(made)
            .abs()
            .lte(new Exact(0.5).add(exact.abs().mul(Number.EPSILON))),
        ).toBe(true);
      }),
      RUNS,
    );
  });
});

describe("arithmetic is exact", () => {
  it("add and subtract", () => {
    fc.assert(
      fc.property(smallLength, smallLength, (left, right) => {
        const sum = add(left, right);
        const difference = subtract(left, right);
        expect(sum.unit).toBe(left.unit);
        expect(new Exact(left.ticks).add(right.ticks).eq(sum.ticks)).toBe(true);
        expect(new Exact(left.ticks).sub(right.ticks).eq(difference.ticks)).toBe(true);
        expect(subtract(sum, right)).toEqual(left);
        expect(add(left, right).ticks).toBe(add(right, left).ticks);
        expect(Object.is(difference.ticks, -0)).toBe(false);
      }),
      RUNS,
    );
  });

  it("multiply by a whole number or a ratio, half to even", () => {
    fc.assert(
      fc.property(
        length,
        fc.integer({ min: -9999, max: 9999 }),
        fc.integer({ min: 1, max: 9999 }),
        (one, numerator, denominator) => {
          const wanted = new Exact(one.ticks)
            .mul(numerator)
            .div(denominator)
            .toDecimalPlaces(0, Decimal.ROUND_HALF_EVEN);
          if (wanted.abs().gt(Number.MAX_SAFE_INTEGER)) {
            expect(codeOf(() => multiply(one, { numerator, denominator }))).toBe("LENGTH_OUT_OF_RANGE");
            return;
          }
          const product = multiply(one, { numerator, denominator });
          expect(wanted.eq(product.ticks)).toBe(true);
          expect(Object.is(product.ticks, -0)).toBe(false);
        },
      ),
      RUNS,
    );
  });

  it("compare", () => {
    fc.assert(
      fc.property(length, length, (left, right) => {
        expect(compareLengths(left, right)).toBe(new Exact(left.ticks).cmp(right.ticks));
        expect(compareLengths(left, right) + compareLengths(right, left)).toBe(0);
        expect(equalLengths(left, right)).toBe(left.ticks === right.ticks);
      }),
      RUNS,
    );
  });

  it("sums outside the safe range are refused, never wrong", () => {
    fc.assert(
      fc.property(length, length, (left, right) => {
        const wanted = new Exact(left.ticks).add(right.ticks);
        if (wanted.abs().gt(Number.MAX_SAFE_INTEGER)) {
          expect(codeOf(() => add(left, right))).toBe("LENGTH_OUT_OF_RANGE");
        } else expect(wanted.eq(add(left, right).ticks)).toBe(true);
      }),
      RUNS,
    );
  });
});

describe("rounding is that of an independent decimal", () => {
  const MOST = { mm: 7, um: 4, in: 6, thou: 3, uin: 0 } as const;

  it("roundLength, all five ways, in every unit", () => {
    fc.assert(
      fc.property(smallLength, unit, fc.nat(7), rounding, (one, in_, asked, way) => {
        const places = Math.min(asked, MOST[in_]);
        const wanted = exactIn(one.ticks, in_).toDecimalPlaces(places, ROUNDINGS[way]);
        const rounded = roundLength(one, { unit: in_, places, rounding: way });
        expect(rounded.unit).toBe(in_);
        expect(wanted.mul(TICKS[in_]).eq(rounded.ticks)).toBe(true);
        expect(roundLength(rounded, { unit: in_, places, rounding: way })).toEqual(rounded);
      }),
      { numRuns: 2000 },
    );
  });

  it("writeLength, all five ways, in every unit and both styles, to 12 places", () => {
    fc.assert(
      fc.property(
        length,
        unit,
        fc.nat(12),
        rounding,
        fc.constantFrom("metric" as const, "inch" as const),
        (one, in_, places, way, style) => {
          const exact = exactIn(one.ticks, in_).toDecimalPlaces(places, ROUNDINGS[way]);
          const wanted = exact.isZero() ? new Exact(0) : exact;
          const text = style === "metric" ? wanted.toFixed() : wanted.toFixed(places).replace(/^(-?)0\./, "$1.");
          expect(writeLength(one, { unit: in_, places, rounding: way, style })).toBe(`${text} ${SYMBOLS[in_]}`);
        },
      ),
      { numRuns: 3000 },
    );
  });

  it("halves, which chance would hardly meet", () => {
    fc.assert(
      fc.property(fc.integer({ min: -9999, max: 9999 }), unit, fc.nat(3), rounding, (count, in_, asked, way) => {
        const places = in_ === "uin" ? 0 : Math.min(asked, MOST[in_] - 1);
        // an odd number of half steps: exactly between two of them
        const value = ((2 * count + 1) * TICKS[in_]) / (2 * 10 ** places);
        if (!Number.isSafeInteger(value)) return;
        const wanted = exactIn(value, in_).toDecimalPlaces(places, ROUNDINGS[way]);
        const rounded = roundLength(lengthOfTicks(value, in_), { places, rounding: way });
        expect(wanted.mul(TICKS[in_]).eq(rounded.ticks)).toBe(true);
      }),
      RUNS,
    );
  });
});

describe("angles", () => {
  const angle = fc
    .tuple(
      fc.oneof(
        fc.integer({ min: -1_296_000_000_000, max: 1_296_000_000_000 }),
        fc.maxSafeInteger(),
        fc.integer({ min: -359, max: 359 }).map((degrees) => degrees * 3_600_000_000),
      ),
      fc.constantFrom("decimal" as const, "dms" as const),
    )
    .map(([value, style]) => angleOfMicroarcseconds(value, style));

  it("come back as they went", () => {
    fc.assert(
      fc.property(angle, (one) => {
        expect(readAngle(one.toString()).microarcseconds).toBe(one.microarcseconds);
        for (const style of ["decimal", "dms"] as const) {
          expect(readAngle(writeAngle(one, { style })).microarcseconds).toBe(one.microarcseconds);
        }
        expect(readAngle(JSON.parse(JSON.stringify(one)) as string).microarcseconds).toBe(one.microarcseconds);
        expect(readAngle(structuredClone(one))).toEqual(one);
      }),
      RUNS,
    );
  });
});

describe("reading any text", () => {
  const READERS: Readonly<Record<string, (text: string) => unknown>> = {
    readLength,
    "readLength with a comma": (text) => readLength(text, { decimalMark: "," }),
    readAngle,
    "readAngle with a comma": (text) => readAngle(text, { decimalMark: "," }),
    readDimension: (text) => readDimension(text),
    "readDimension in inches": (text) => readDimension(text, { unit: "in" }),
    mm,
    inch,
    asLength,
  };

  it.each(Object.entries(READERS))("%s gives a value or a LimitsError, nothing else", (_, read) => {
    fc.assert(
      fc.property(anyText, (text) => {
        try {
          read(text);
        } catch {
          expect(codeOf(() => read(text))).toMatch(/^[A-Z]+(?:_[A-Z]+)+$/);
        }
      }),
      { numRuns: 2000 },
    );
  });
});
