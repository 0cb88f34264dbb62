import { lengthOfTicks, limits } from "limitsmith";
import type { Length, LengthUnit, Limits, Rounding } from "limitsmith";
import { Decimal } from "decimal.js";
import fc from "fast-check";

/** An own copy with room for every digit that a tick can have in any unit. */
export const Exact = Decimal.clone({ precision: 120, defaults: true });

/** Ticks of 0.1 nm to the unit; 1 in = 25.4 mm exactly. */
export const TICKS: Readonly<Record<LengthUnit, number>> = {
  mm: 10_000_000,
  um: 10_000,
  in: 254_000_000,
  thou: 254_000,
  uin: 254,
};

/** The same five ways of rounding in decimal.js's words. */
export const ROUNDINGS: Readonly<Record<Rounding, Decimal.Rounding>> = {
  nearest: Decimal.ROUND_HALF_EVEN,
  "nearest-away": Decimal.ROUND_HALF_UP,
  "toward-zero": Decimal.ROUND_DOWN,
  up: Decimal.ROUND_CEIL,
  down: Decimal.ROUND_FLOOR,
};

export const unit: fc.Arbitrary<LengthUnit> = fc.constantFrom("mm", "um", "in", "thou", "uin");
export const rounding: fc.Arbitrary<Rounding> = fc.constantFrom("nearest", "nearest-away", "toward-zero", "up", "down");

/** Ticks of any size, with many small ones and many that are whole in some unit. */
export const ticks: fc.Arbitrary<number> = fc.oneof(
  fc.maxSafeInteger(),
  fc.integer({ min: -1000, max: 1000 }),
  fc.integer({ min: -31_500_000_000, max: 31_500_000_000 }),
  fc
    .tuple(fc.integer({ min: -400_000, max: 400_000 }), fc.constantFrom(127, 254, 1000, 10_000, 254_000))
    .map(([count, step]) => count * step),
);

export const length: fc.Arbitrary<Length> = fc
  .tuple(ticks, unit)
  .map(([value, written]) => lengthOfTicks(value, written));

/** A length well inside the safe range, so that sums of a few stay in it. */
export const smallLength: fc.Arbitrary<Length> = fc
  .tuple(fc.integer({ min: -40_000_000_000, max: 40_000_000_000 }), unit)
  .map(([value, written]) => lengthOfTicks(value, written));

const deviation: fc.Arbitrary<number> = fc.oneof(
  fc.integer({ min: -5_000_000, max: 5_000_000 }),
  fc.integer({ min: -500, max: 500 }).map((um) => um * 10_000),
  fc.integer({ min: -90, max: 90 }).map((tenths) => tenths * 25_400),
);

/** Limits as drawings have them: a nominal to some meters, deviations to half a millimetre. */
export const someLimits: fc.Arbitrary<Limits> = fc
  .record({
    nominal: fc.oneof(
      fc.integer({ min: 0, max: 31_500_000_000 }),
      fc.integer({ min: 0, max: 60_000 }).map((thou) => thou * 254_000),
    ),
    one: deviation,
    other: deviation,
    unit,
    designation: fc.constantFrom("m6", "H7", null),
  })
  .map(({ nominal, one, other, unit: written, designation }) =>
    limits({
      nominal: lengthOfTicks(nominal, written),
      upper: lengthOfTicks(Math.max(one, other), "um"),
      lower: lengthOfTicks(Math.min(one, other), "um"),
      designation,
    }),
  );

/** The same, with deviations equal to both sides. */
export const evenLimits: fc.Arbitrary<Limits> = fc.tuple(someLimits, deviation).map(([given, value]) =>
  limits({
    nominal: given.nominal,
    upper: lengthOfTicks(Math.abs(value), "um"),
    lower: lengthOfTicks(-Math.abs(value), "um"),
    designation: given.designation,
  }),
);

/** Any text at all, and text that looks like what drawings say until it does not. */
export const anyText: fc.Arbitrary<string> = fc.oneof(
  fc.string({ unit: "binary", maxLength: 200 }),
  fc.string({ unit: "grapheme", maxLength: 60 }),
  fc.string({
    unit: fc.constantFrom(
      ..."0123456789.,/-+\u2212 \u00a0°'\"\u2032\u2033\u00b5\u03bcmuinthoudegHhKkJjSsZzCc±⌀x\u0000\ud800\u0660",
    ),
    maxLength: 24,
  }),
  fc
    .tuple(
      fc.constantFrom("", "-", "+", "\u2212", " "),
      fc.oneof(
        fc.nat().map(String),
        fc.double().map(String),
        fc.tuple(fc.nat(99), fc.nat(9), fc.nat(9)).map(([a, b, c]) => `${a} ${b}/${c}`),
      ),
      fc.constantFrom("", " ", "  ", "\t"),
      fc.constantFrom(
        "mm",
        "in",
        '"',
        "um",
        "\u00b5m",
        "mil",
        "thou",
        "uin",
        "°",
        "deg",
        "'",
        "H7",
        "k6",
        "H7/k6",
        "H7-k6",
        "",
      ),
    )
    .map((parts) => parts.join("")),
);
