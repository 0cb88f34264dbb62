import {
  inchKey,
  inchKeyseat,
  keyedAssembly,
  keyLoad,
  keyseatControl,
  keyseatCrown,
  keyseatRows,
  keyseatSideDepth,
  lengthOfTicks,
  limits,
  metricKey,
  metricKeyLength,
  metricKeyseat,
  decodeWoodruffNumber,
  woodruffKey,
} from "limitsmith";
import type { KeyedParts, KeyShape, Length, LengthUnit, Limits, StackRange } from "limitsmith";
import fc from "fast-check";
import { describe, expect, it } from "vitest";

const INCH = 254_000_000;
const MM = 10_000_000;
const THOU = 254_000;

/** Shaft diameters that B17.1 covers, many of them whole sixteenths. */
const inchShaft = fc.oneof(
  fc.integer({ min: (5 * INCH) / 16 + 1, max: 30 * INCH }),
  fc.integer({ min: 6, max: 480 }).map((sixteenths) => (sixteenths * INCH) / 16),
  fc.integer({ min: 313, max: 30_000 }).map((thou) => thou * THOU),
);
const metricShaft = fc.oneof(
  fc.integer({ min: 6 * MM, max: 500 * MM }),
  fc.integer({ min: 6, max: 500 }).map((mm) => mm * MM),
);

/** A limit pair about a size. */
function around(ticks: number, spread: number, unit: LengthUnit): fc.Arbitrary<Limits> {
  return fc.tuple(fc.integer({ min: -spread, max: spread }), fc.integer({ min: 0, max: spread })).map(([low, width]) =>
    limits({
      nominal: lengthOfTicks(ticks, unit),
      upper: lengthOfTicks(low + width, "um"),
      lower: lengthOfTicks(low, "um"),
    }),
  );
}

/** Whole square root, rounded to the nearest, without floating point. */
function root(value: bigint): bigint {
  if (value < 2n) return value;
  let guess = 1n << BigInt(Math.ceil(value.toString(2).length / 2));
  for (let next = (guess + value / guess) / 2n; next < guess; next = (guess + value / guess) / 2n) guess = next;
  return guess;
}

/** Ticks from the opposite side to the edges of a seat: (d + √(d² − w²)) / 2, to the nearest. */
function edge(diameter: number, width: number): number {
  const [d, w] = [BigInt(diameter), BigInt(width)];
  // in millionths of a tick, so that the last rounding is the only one that counts
  const scaled = (d * 1_000_000n + root((d * d - w * w) * 1_000_000_000_000n)) / 2n;
  return Number((scaled + 500_000n) / 1_000_000n);
}

type Ends = readonly [max: Length, min: Length];
const both = ({ max, min }: Limits): Ends => [max, min];

describe("B17.1 keyseats", () => {
  it("a standard parallel joint is never pinched at its top with the shaft touching the opposite side", () => {
    fc.assert(
      fc.property(
        inchShaft,
        fc.constantFrom<KeyShape | undefined>("square", "rectangular", undefined),
        fc.constantFrom<1 | 2>(1, 2),
        fc.integer({ min: 0, max: 2 * THOU }),
        (ticks, wanted, keyClass, play) => {
          const diameter = lengthOfTicks(ticks, "in");
          const { preferredShape } = inchKey(diameter);
          // the first row has no rectangular key, those over 15 in no square one
          const shape = wanted === undefined || ticks <= (7 * INCH) / 16 || ticks > 15 * INCH ? preferredShape : wanted;
          const key = inchKey(diameter, { shape });
          const single = (size: number): Limits =>
            limits({ nominal: lengthOfTicks(size, "in"), upper: "0 in", lower: "0 in" });
          for (const depths of ["formula", "printed"] as const) {
            const seat = inchKeyseat(diameter, { shape, class: keyClass, depths });
            const { away } = keyedAssembly({
              shaft: single(ticks),
              bore: single(ticks + play),
              key: (keyClass === 1 ? key.barStock : key.keystock) ?? key.keystock,
              shaftKeyseat: seat.shaft,
              hubKeyseat: seat.hub,
            }).top;
            // S and T are rounded apart: that alone may take up to 0.001 in
            expect(away.min.ticks).toBeGreaterThanOrEqual(depths === "formula" ? 0 : -THOU);
            if (shape === "square") expect(away.min.ticks).toBeGreaterThan(0);
          }
        },
      ),
      { numRuns: 800 },
    );
  });

  it("S, T and their tolerances hold together; the printed rounding is at most half a thousandth", () => {
    fc.assert(
      fc.property(inchShaft, (ticks) => {
        const diameter = lengthOfTicks(ticks, "in");
        const exact = inchKeyseat(diameter, { class: 2, depths: "formula" });
        const printed = inchKeyseat(diameter, { class: 2 });
        const { height, width } = exact.key;
        expect(exact.hub.control.nominal.ticks - exact.shaft.control.nominal.ticks).toBe(height.ticks + 5 * THOU);
        expect(exact.shaft.control.nominal.ticks).toBe(edge(ticks, width.ticks) - Math.floor(height.ticks / 2));
        for (const member of ["shaft", "hub"] as const) {
          const [round, plain] = [printed[member].control.nominal.ticks, exact[member].control.nominal.ticks];
          expect(round % THOU).toBe(0);
          expect(Math.abs(round - plain)).toBeLessThanOrEqual(THOU / 2 + 1);
        }
        const taper = inchKeyseat(diameter, { class: 2, depths: "formula", kind: "taper" });
        // T of a taper key is 0.025 in less, S the same
        expect(exact.hub.control.nominal.ticks - taper.hub.control.nominal.ticks).toBe(25 * THOU);
        expect(taper.shaft.control.nominal.ticks).toBe(exact.shaft.control.nominal.ticks);
      }),
      { numRuns: 1000 },
    );
  });
});

describe("measured depth", () => {
  it("S + side depth + crown is the diameter, to the tick, and every way back is exact", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1000, max: 30 * INCH }),
        fc.double({ min: 0.001, max: 0.95, noNaN: true }),
        fc.double({ min: 0.001, max: 0.9, noNaN: true }),
        (d, widthShare, depthShare) => {
          const diameter = lengthOfTicks(d, "in");
          const width = lengthOfTicks(Math.max(1, Math.floor(d * widthShare)), "in");
          const crown = keyseatCrown(diameter, width);
          expect(d - crown.ticks).toBe(edge(d, width.ticks));
          const sideDepth = lengthOfTicks(Math.max(1, Math.floor((d - crown.ticks) * depthShare)), "in");
          const s = keyseatControl({ diameter, width, member: "shaft", sideDepth });
          expect(s.ticks + sideDepth.ticks + crown.ticks).toBe(d);
          expect(keyseatSideDepth({ diameter, width, member: "shaft", control: s }).ticks).toBe(sideDepth.ticks);
          const t = keyseatControl({ diameter, width, member: "hub", sideDepth });
          expect(t.ticks + crown.ticks - sideDepth.ticks).toBe(d);
          expect(keyseatSideDepth({ diameter, width, member: "hub", control: t }).ticks).toBe(sideDepth.ticks);
        },
      ),
      { numRuns: 1500 },
    );
  });
});

type Form = "control" | "depth" | "sideDepth";

/** A joint about 40 mm with a 12 x 8 key, each depth stated in any of the three ways. */
const joint: fc.Arbitrary<{ parts: KeyedParts; forms: readonly [Form, Form] }> = fc
  .record({
    unit: fc.constantFrom<LengthUnit>("mm", "in"),
    diameter: fc.integer({ min: 30 * MM, max: 60 * MM }),
    forms: fc.tuple(
      fc.constantFrom<Form>("control", "depth", "sideDepth"),
      fc.constantFrom<Form>("control", "depth", "sideDepth"),
    ),
  })
  .chain(({ unit, diameter, forms }) => {
    const spread = 2_000_000;
    const depth = (form: Form, hub: boolean): number =>
      form === "control" ? (hub ? diameter + 3 * MM : diameter - 5 * MM) : hub ? 3 * MM : 5 * MM;
    return fc
      .record({
        shaft: around(diameter, spread, unit),
        bore: around(diameter, spread, unit),
        width: around(12 * MM, spread, unit),
        height: around(8 * MM, spread, unit),
        shaftWidth: around(12 * MM, spread, unit),
        hubWidth: around(12 * MM, spread, unit),
        shaftDepth: around(depth(forms[0], false), spread, unit),
        hubDepth: around(depth(forms[1], true), spread, unit),
      })
      .map((sizes) => ({
        forms,
        parts: {
          shaft: sizes.shaft,
          bore: sizes.bore,
          key: { width: sizes.width, height: sizes.height },
          shaftKeyseat: { width: sizes.shaftWidth, [forms[0]]: sizes.shaftDepth },
          hubKeyseat: { width: sizes.hubWidth, [forms[1]]: sizes.hubDepth },
        },
      }));
  });

/** Whole-number half, a half going to the even one. */
function halfOf(value: number): number {
  const below = Math.floor(value / 2);
  return value % 2 === 0 ? below : below % 2 === 0 ? below : below + 1;
}

describe("keyedAssembly", () => {
  it("equals brute force over every corner of the tolerances, in every form of depth", () => {
    fc.assert(
      fc.property(joint, ({ parts, forms }) => {
        const found = keyedAssembly(parts);
        const of = (value: unknown): Ends => both(value as Limits);
        const nominalWidth = (parts.key.width as Limits).nominal.ticks;
        const floor = (hub: boolean, form: Form, diameter: number, depth: number): number => {
          if (form === "control") return depth;
          const from = form === "depth" ? diameter : edge(diameter, nominalWidth);
          return hub ? from + depth : from - depth;
        };
        const corners: Record<string, number[]> = {};
        const note = (name: string, value: number): void => {
          (corners[name] ??= []).push(value);
        };
        for (const ds of of(parts.shaft)) {
          for (const db of of(parts.bore)) {
            for (const x of of(parts.shaftKeyseat[forms[0]])) {
              for (const y of of(parts.hubKeyseat[forms[1]])) {
                for (const h of of(parts.key.height)) {
                  const s = floor(false, forms[0], ds.ticks, x.ticks);
                  const t = floor(true, forms[1], db.ticks, y.ticks);
                  const play = Math.max(0, db.ticks - ds.ticks);
                  const gap = t - s - h.ticks;
                  note("away", gap);
                  note("centred", gap - halfOf(play));
                  note("toward", gap - play);
                  note("overKey", s + h.ticks);
                  note("aboveShaft", s + h.ticks - ds.ticks);
                  note("flankInShaft", edge(ds.ticks, nominalWidth) - s);
                  note("flankInHub", s + h.ticks - edge(db.ticks, nominalWidth));
                  note("flankLifted", edge(ds.ticks, nominalWidth) + h.ticks - t);
                }
              }
            }
          }
        }
        for (const w of of(parts.key.width)) {
          for (const b of of(parts.shaftKeyseat.width)) note("sideInShaft", b.ticks - w.ticks);
          for (const b of of(parts.hubKeyseat.width)) note("sideInHub", b.ticks - w.ticks);
        }
        const ranges: Record<string, StackRange | null> = { ...found, ...found.top } as never;
        for (const [name, values] of Object.entries(corners)) {
          const range = ranges[name];
          expect([name, range?.max.ticks, range?.min.ticks]).toEqual([name, Math.max(...values), Math.min(...values)]);
        }
        const sides = [...(corners["sideInShaft"] ?? []), ...(corners["sideInHub"] ?? [])];
        const always = [...sides, ...(corners["away"] ?? [])].every((gap) => gap >= 0);
        expect(found.assembles === "always assembles").toBe(always);
        expect(found.canLift).toBe(
          Math.max(...(corners["sideInShaft"] ?? [])) > 0 && Math.max(...(corners["away"] ?? [])) > 0,
        );
      }),
      { numRuns: 400 },
    );
  });

  it("every chain adds up to its limit", () => {
    fc.assert(
      fc.property(joint, ({ parts }) => {
        const found = keyedAssembly(parts);
        const ranges = [
          found.sideInShaft,
          found.sideInHub,
          found.top.away,
          found.top.centred,
          found.top.toward,
          found.overKey,
          found.aboveShaft,
          found.flankInShaft,
          found.flankInHub,
          found.flankLifted,
        ];
        for (const range of ranges) {
          if (range === null) throw new Error("both widths are given");
          for (const [end, chain] of [
            [range.max, range.maxChain],
            [range.min, range.minChain],
          ] as const) {
            const sum = chain.reduce((total, { sign, value }) => total + (sign === "+" ? 1 : -1) * value.ticks, 0);
            expect(sum).toBe(end.ticks);
          }
        }
      }),
      { numRuns: 300 },
    );
  });
});

describe("metric keyways", () => {
  it("d - t1 with reversed sign and d + t2, at any diameter and in any standard", () => {
    fc.assert(
      fc.property(
        metricShaft,
        fc.constantFrom("ISO/R 773", "DIN 6885-1", "ISO/R 774", "JIS B 1301"),
        (ticks, standard) => {
          const diameter = lengthOfTicks(ticks, "mm");
          const { shaft, hub, key } = metricKeyseat(diameter, { standard });
          expect(shaft.control?.nominal.ticks).toBe(ticks - shaft.nominalDepth.ticks);
          expect(hub.control?.nominal.ticks).toBe(ticks + hub.nominalDepth.ticks);
          expect(shaft.control?.lowerDeviation.ticks).toBe(-(shaft.depth?.upperDeviation.ticks ?? NaN));
          expect(shaft.control?.upperDeviation.ticks).toBe(0);
          expect(hub.control?.upperDeviation.ticks).toBe(hub.depth?.upperDeviation.ticks);
          // the depth tolerance goes by the section: 0.1 to b 6, 0.2 to b 32, 0.3 above
          const b = key.width.to("mm");
          expect(shaft.depth?.tolerance.to("mm")).toBe(b <= 6 ? 0.1 : b <= 32 ? 0.2 : 0.3);
          // a standard key fits its own shaft
          expect(metricKey(diameter, { standard }).width.ticks).toBeLessThan(ticks);
        },
      ),
      { numRuns: 1000 },
    );
  });

  it("the nearest length is of the series, and none is nearer", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 700 * MM }), (ticks) => {
        const found = metricKeyLength(lengthOfTicks(ticks, "mm"));
        const away = (one: Length | null): number => (one === null ? Infinity : Math.abs(one.ticks - ticks));
        expect(away(found.nearest)).toBe(found.inSeries ? 0 : Math.min(away(found.shorter), away(found.longer)));
        expect(metricKeyLength(found.nearest).valid).toBe(true);
      }),
      { numRuns: 1000 },
    );
  });
});

describe("keyLoad", () => {
  it("the needed length bears exactly the torque, and the capacity at that length is the torque", () => {
    const value = fc.double({ min: 0.5, max: 5000, noNaN: true });
    fc.assert(
      fc.property(
        value,
        value,
        value,
        fc.constantFrom("square", "round", "one round"),
        (load, shear, bearing, ends) => {
          const parts = {
            torque: { value: load, unit: "Nm" },
            shaftDiameter: "60 mm",
            key: { width: "18 mm", height: "11 mm" },
            ends,
            pressure: "half height",
            allowables: { shear: { value: shear, unit: "MPa" }, bearing: { value: bearing, unit: "MPa" } },
          } as const;
          const { neededLength } = keyLoad(parts);
          const length = neededLength.governing;
          if (length === null) throw new Error("a length is needed");
          const again = keyLoad({ ...parts, length });
          // a length is whole ticks: short keys feel that
          const bears = again.bearingLength?.ticks ?? NaN;
          expect((again.capacity.governing?.value ?? NaN) / load).toBeGreaterThan(1 - 2 / bears - 1e-9);
          expect((again.capacity.governing?.value ?? NaN) / load).toBeLessThan(1 + 2 / bears + 1e-9);
          const worst = Math.max((again.shearStress?.value ?? 0) / shear, (again.pressure?.value ?? 0) / bearing);
          expect(Math.abs(worst - 1)).toBeLessThan(2 / bears + 1e-9);
        },
      ),
      { numRuns: 800 },
    );
  });
});

describe("anything at all", () => {
  it("throws nothing but a LimitsError", () => {
    const functions: readonly ((one: never, other: never) => unknown)[] = [
      inchKey,
      inchKeyseat,
      metricKey,
      metricKeyseat,
      metricKeyLength,
      keyedAssembly,
      keyLoad,
      keyseatCrown,
      keyseatRows,
      keyseatSideDepth,
      decodeWoodruffNumber,
      woodruffKey,
    ];
    const anything = fc.oneof(
      fc.anything(),
      fc.constantFrom("1 in", "40 mm", "B17.1", "404", "-5 mm"),
      fc.record({
        class: fc.constantFrom(1, 2, 3, 4),
        standard: fc.constantFrom("B17.1", "ISO 3912", "DIN 6885-3", "x"),
        member: fc.constantFrom("shaft", "hub"),
        fit: fc.constantFrom("free", "normal", "close", undefined),
        key: fc.record({ width: fc.constantFrom("2 mm", "1/4 in", "0 mm"), height: fc.constantFrom("2 mm", "1/4 in") }),
      }),
    );
    fc.assert(
      fc.property(fc.constantFrom(...functions), anything, anything, (task, one, other) => {
        try {
          const result = JSON.stringify(task(one as never, other as never)) as string | undefined;
          expect(result ?? "").not.toMatch(/NaN|Infinity/);
        } catch (error) {
          expect((error as Error).name).toBe("LimitsError");
        }
      }),
      { numRuns: 4000 },
    );
  });
});
