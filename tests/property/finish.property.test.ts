import {
  LimitsError,
  acceptRoughness,
  asRoughness,
  ballNoseCusp,
  feedForRoughness,
  finishForTolerance,
  gradeFindings,
  gradeOfTolerance,
  inchStandardTolerance,
  lengthOfTicks,
  mm,
  preferredRoughness,
  processFinish,
  processNames,
  processReach,
  processesFor,
  processesForGrade,
  roughness,
  sharpToolRoughness,
  sideMilledRoughness,
  standardTolerance,
  turnedRoughness,
  turnedRoughnessWithEndEdge,
} from "limitsmith";
import type { GradeName, Length, RoughnessUnit } from "limitsmith";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { anyText, Exact, TICKS } from "./arbitraries.js";

const unit = fc.constantFrom<RoughnessUnit[]>("um", "uin");
// up to 1 mm, with many small ones and many that are whole in µm or µin
const ticks = fc.oneof(
  fc.integer({ min: 1, max: 10_000_000 }),
  fc.integer({ min: 1, max: 2000 }),
  fc.integer({ min: 1, max: 1000 }).map((count) => count * 10_000),
  fc.integer({ min: 1, max: 8000 }).map((count) => count * 254),
);
const ra: fc.Arbitrary<Length> = fc.tuple(ticks, unit).map(([value, written]) => lengthOfTicks(value, written));
const preferred = [...preferredRoughness("um").all, ...preferredRoughness("uin").all];

describe("roughness", () => {
  it("converts exactly, both ways, and comes back from JSON and structuredClone", () => {
    fc.assert(
      fc.property(ra, fc.constantFrom("Ra", "RMS"), fc.boolean(), (value, parameter, max) => {
        const read = roughness({ value, parameter, max });
        expect(read.converted.ticks).toBe(read.ra.ticks);
        expect(new Set([read.ra.unit, read.converted.unit])).toEqual(new Set(["um", "uin"]));
        expect(roughness(read.converted).converted).toEqual(read.ra);
        expect(asRoughness(JSON.parse(JSON.stringify(read)) as typeof read)).toMatchObject({
          parameter,
          max,
          grade: read.grade,
        });
        expect(asRoughness(JSON.parse(JSON.stringify(read)) as typeof read).ra.ticks).toBe(read.ra.ticks);
        expect(asRoughness(structuredClone(read))).toEqual(read);
        if (parameter === "RMS") {
          const exact = new Exact(value.ticks).div("1.11");
          expect(exact.sub(read.ra.ticks).abs().lte(0.5)).toBe(true);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it("63 µin is 1.6002 µm: text in µin gives 0.0254 µm each, to the last figure", () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 39_370 }), (count) => {
        const exact = new Exact(count).mul("0.0254").toString();
        expect(roughness(`${count} µin`).converted.toString()).toBe(`${exact} µm`);
      }),
    );
  });

  it("its neighbours are the next values of the series of its own unit", () => {
    fc.assert(
      fc.property(ra, (value) => {
        const read = roughness(value);
        const { all, firstChoice } = preferredRoughness(value.unit as RoughnessUnit);
        for (const [list, key] of [
          [all, "anyChoice"],
          [firstChoice, "firstChoice"],
        ] as const) {
          const finer = read.finer[key];
          const coarser = read.coarser[key];
          expect(list.filter((one) => one.ticks < value.ticks)).toHaveLength(
            finer === null ? 0 : list.findIndex((one) => one.ticks === finer.ticks) + 1,
          );
          expect(list.filter((one) => one.ticks > value.ticks)).toHaveLength(
            coarser === null ? 0 : list.length - list.findIndex((one) => one.ticks === coarser.ticks),
          );
          if (finer !== null) expect(finer.ticks).toBeLessThan(value.ticks);
          if (coarser !== null) expect(coarser.ticks).toBeGreaterThan(value.ticks);
        }
      }),
      { numRuns: 1000 },
    );
  });

  it("preferred series rise, and pairs rise together", () => {
    for (const written of ["um", "uin"] as const) {
      const { all, firstChoice } = preferredRoughness(written);
      expect(firstChoice).toHaveLength(12);
      for (const list of [all, firstChoice]) {
        const values = list.map((one) => one.ticks);
        expect(values).toEqual([...new Set(values)].sort((left, right) => left - right));
        const partners = list.flatMap(
          (one) => roughness(one).pair?.ticks ?? roughness(one).secondChoicePair?.ticks ?? [],
        );
        expect(partners).toEqual([...partners].sort((left, right) => left - right));
      }
      for (const one of firstChoice) {
        const { pair } = roughness(one);
        expect(pair === null ? null : roughness(pair).pair).toEqual(one);
        // R10/3 by rounding: a step is twice, within 5 %
        const { coarser } = roughness(one);
        if (coarser.firstChoice !== null) expect(coarser.firstChoice.ticks / one.ticks).toBeCloseTo(1.9953, 0);
      }
    }
  });

  it("any text at all is read or refused with a code", () => {
    fc.assert(
      fc.property(
        fc.oneof(
          anyText,
          fc
            .tuple(
              fc.constantFrom("", "Ra ", "Ra", "N", "Rz ", "RMS ", "Ramax ", "AA:", "CLA="),
              fc.oneof(fc.nat(9999).map(String), fc.double().map(String), anyText),
              fc.constantFrom("", " µm", "µin", " um", " RMS", " uin max", " max", " mm"),
            )
            .map((parts) => parts.join("")),
        ),
        fc.constantFrom(undefined, "um" as const, "uin" as const),
        (text, written) => {
          try {
            expect(roughness(text, written === undefined ? undefined : { unit: written }).ra.ticks).toBeGreaterThan(0);
          } catch (error) {
            expect(error).toBeInstanceOf(LimitsError);
          }
        },
      ),
      { numRuns: 3000 },
    );
  });
});

describe("processes", () => {
  const rows = processNames()
    .filter((one) => one.hasFinish)
    .map((one) => one.name);

  it.each(preferred.map((one) => [one.toString(), one] as const))(
    "processesFor(%s) agrees with processFinish and processReach",
    (_, value) => {
      const { average, lessFrequent, notKnown, outside } = processesFor(value);
      const found = [...average, ...lessFrequent, ...notKnown, ...outside];
      expect(new Set(found.map((one) => one.row)).size).toBe(31);
      expect(found).toHaveLength(31);
      const written = value.unit as RoughnessUnit;
      for (const process of rows) {
        const { row, average: band, overall } = processFinish(process);
        const at = (end: { um: Length; uin: Length | null }): number =>
          (written === "uin" ? (end.uin ?? end.um) : end.um).ticks;
        const within = value.ticks >= at(band.finest) && value.ticks <= at(band.coarsest);
        const fine = value.ticks < at(band.finest);
        const end = fine ? overall.finest : overall.coarsest;
        const expected = within
          ? average
          : end === null
            ? notKnown
            : (fine ? value.ticks >= at(end) : value.ticks <= at(end))
              ? lessFrequent
              : outside;
        expect(expected.map((one) => one.row)).toContain(row);
        expect(expected.find((one) => one.row === row)?.reach).toBe(processReach(process, value).reach);
      }
    },
  );

  it("a finer roughness is never nearer to the average band from its fine side", () => {
    const order = ["average", "less frequent", "not known", "outside"];
    fc.assert(
      fc.property(fc.constantFrom(...rows), ra, ra, (process, one, other) => {
        if (one.unit !== other.unit) return;
        const [fine, coarse] = one.ticks < other.ticks ? [one, other] : [other, one];
        const [left, right] = [processReach(process, fine), processReach(process, coarse)];
        if (right.side === "finer")
          expect(order.indexOf(left.reach)).toBeGreaterThanOrEqual(order.indexOf(right.reach));
        if (left.side === "coarser")
          expect(order.indexOf(right.reach)).toBeGreaterThanOrEqual(order.indexOf(left.reach));
      }),
    );
  });

  it("grades: every line stands in one list, and findings agree with it", () => {
    for (let grade = -1; grade <= 18; grade++) {
      const { usual, finerThanNeeded, notUsual } = processesForGrade(grade);
      expect(usual.length + finerThanNeeded.length + notUsual.length).toBe(51);
      for (const one of usual) expect(grade >= one.finest && grade <= one.coarsest).toBe(true);
      for (const one of finerThanNeeded) expect(grade).toBeGreaterThan(one.coarsest);
      for (const one of notUsual) expect(grade).toBeLessThan(one.finest);
      // milling is in both charts: 10 to 13, and 10
      expect(gradeFindings(grade, "milling").map((one) => one.code)).toEqual(
        grade < 10 ? ["PROCESS_DOES_NOT_REACH_GRADE"] : grade > 13 ? ["PROCESS_FINER_THAN_GRADE_NEEDS"] : [],
      );
    }
  });
});

/** Ra, Rq and Rt of a profile over one feed, by the midpoint rule. */
function integrate(profile: (x: number) => number, feed: number): { ra: number; rq: number; rt: number } {
  const count = 20_000;
  const heights = Array.from({ length: count }, (_, index) => profile(((index + 0.5) / count - 0.5) * feed));
  const mean = heights.reduce((sum, one) => sum + one, 0) / count;
  const ra_ = heights.reduce((sum, one) => sum + Math.abs(one - mean), 0) / count;
  const rq = Math.sqrt(heights.reduce((sum, one) => sum + (one - mean) ** 2, 0) / count);
  return { ra: ra_, rq, rt: Math.max(...heights, profile(feed / 2)) - Math.min(...heights) };
}

const near = (found: Length, wanted: number, share: number): void => {
  // half a tick of rounding, and the error of the sum
  expect(Math.abs(found.ticks - wanted)).toBeLessThanOrEqual(0.5 + wanted * share);
};

const radius = fc.integer({ min: 2_000_000, max: 60_000_000 });
const share = fc.double({ min: 0.02, max: 0.5, noNaN: true });

describe("theoretical roughness against numerical integration", () => {
  it("one feed of a parabola, and of the circle itself", () => {
    fc.assert(
      fc.property(radius, share, (r, part) => {
        const feed = Math.round(r * part);
        const found = turnedRoughness({ feed: lengthOfTicks(feed, "mm"), noseRadius: lengthOfTicks(r, "mm") });
        const parabola = integrate((x) => (x * x) / (2 * r), feed);
        near(found.ra, parabola.ra, 1e-5);
        near(found.rq, parabola.rq, 1e-5);
        near(found.rt, parabola.rt, 1e-5);
        near(found.raShortForm, parabola.rt / 4, 1e-5);
        const circle = integrate((x) => r - Math.sqrt(r * r - x * x), feed);
        near(found.rtOfCircle, circle.rt, 1e-5);
        // the parabola is within 1.6 % of the circle while f/r is under 0.5 (a journal paper on the approximation)
        expect(Math.abs(found.rt.ticks - circle.rt)).toBeLessThanOrEqual(0.016 * circle.rt + 1);
        expect(Math.abs(found.ra.ticks - circle.ra)).toBeLessThanOrEqual(0.016 * circle.ra + 1);
      }),
      { numRuns: 60 },
    );
  });

  it("a sharp nose: the triangle of its edges", () => {
    const angle = fc.integer({ min: 1, max: 60 });
    fc.assert(
      fc.property(angle, angle, fc.integer({ min: 200_000, max: 20_000_000 }), (side, end, feed) => {
        const cot = (degrees: number): number => 1 / Math.tan((degrees * Math.PI) / 180);
        // one flank rises at Ce, the other falls at 90° - Cs
        const rise = 1 / cot(end);
        const fall = Math.tan(((90 - side) * Math.PI) / 180);
        const valley = feed / (1 + rise / fall);
        const { ra: wanted, rt } = integrate(
          (x) => (x + feed / 2 < valley ? (x + feed / 2) * rise : (feed / 2 - x) * fall),
          feed,
        );
        const found = sharpToolRoughness({
          feed: lengthOfTicks(feed, "mm"),
          sideCuttingEdgeAngle: `${side}°`,
          endCuttingEdgeAngle: `${end}°`,
        });
        near(found.ra, wanted, 1e-3);
        near(found.rt, rt, 2e-3);
      }),
      { numRuns: 60 },
    );
  });

  it("nose and end edge together: the highest point of the envelope", () => {
    fc.assert(
      fc.property(
        radius,
        fc.integer({ min: 2, max: 20 }),
        fc.double({ min: 0.3, max: 3, noNaN: true }),
        (r, end, part) => {
          const angle = (end * Math.PI) / 180;
          const limit = 2 * r * Math.sin(angle);
          const feed = Math.round(limit * part);
          // the tool from its lowest point: arc, and behind its tangent point the straight end edge
          const tool = (x: number): number =>
            x > r * Math.sin(angle)
              ? r * (1 - Math.cos(angle)) + (x - r * Math.sin(angle)) * Math.tan(angle)
              : r - Math.sqrt(Math.max(0, r * r - x * x));
          if (feed > r) return;
          // what two cuts, one feed apart, leave between them
          let peak = 0;
          for (let step = 0; step <= 40_000; step++) {
            const x = (step / 40_000) * feed;
            peak = Math.max(peak, Math.min(tool(x), tool(x - feed)));
          }
          const found = turnedRoughnessWithEndEdge({
            feed: lengthOfTicks(feed, "mm"),
            noseRadius: lengthOfTicks(r, "mm"),
            endCuttingEdgeAngle: `${end}°`,
          });
          expect(found.form).toBe(part > 1 ? "circle and end cutting edge" : "circle");
          near(found.rt, peak, 1e-3);
        },
      ),
      { numRuns: 60 },
    );
  });

  it("side milling: the curvature of the tooth path at its lowest point", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 40_000_000, max: 400_000_000 }),
        fc.double({ min: 0.002, max: 0.02, noNaN: true }),
        fc.integer({ min: 2, max: 8 }),
        fc.constantFrom("up" as const, "down" as const),
        (diameter, part, teeth, direction) => {
          const feed = Math.round(diameter * part);
          const R = diameter / 2;
          const perTurn = feed * teeth;
          // the tooth path: a circle that moves; with the feed along the cut (up) or against it (down)
          const sign = direction === "up" ? 1 : -1;
          const at = (angle: number): [number, number] => [
            R * Math.sin(angle) + (sign * perTurn * angle) / (2 * Math.PI),
            R * (1 - Math.cos(angle)),
          ];
          // height where the path is half a feed away from its lowest point
          let low = 0;
          let high = 0.5;
          for (let step = 0; step < 60; step++) {
            const middle = (low + high) / 2;
            if (at(middle)[0] < feed / 2) low = middle;
            else high = middle;
          }
          const cut = { feedPerTooth: lengthOfTicks(feed, "mm"), cutterDiameter: lengthOfTicks(diameter, "mm") };
          const found = sideMilledRoughness({ ...cut, direction, teeth });
          // the reference form is f²/(8 (R ± f z/π)): the path's curvature to first order in f z/R
          const drift = perTurn / (2 * Math.PI) / R;
          near(found.rt, at(low)[1], 4 * drift * drift + 1e-3);
          const arc = sideMilledRoughness(cut);
          if (direction === "up") expect(found.rt.ticks).toBeLessThanOrEqual(arc.rt.ticks);
          else expect(found.rt.ticks).toBeGreaterThanOrEqual(arc.rt.ticks);
        },
      ),
      { numRuns: 60 },
    );
  });

  it("ball nose: the cusp between two circles", () => {
    fc.assert(
      fc.property(radius, share, (r, part) => {
        const spacing = Math.round(r * part);
        const { cusp, cuspShortForm } = ballNoseCusp({
          ballRadius: lengthOfTicks(r, "mm"),
          lineSpacing: lengthOfTicks(spacing, "mm"),
        });
        const exact = new Exact(r).sub(new Exact(r).pow(2).sub(new Exact(spacing).pow(2).div(4)).sqrt());
        expect(exact.sub(cusp.ticks).abs().lte(0.5001)).toBe(true);
        expect(new Exact(spacing).pow(2).div(8).div(r).sub(cuspShortForm.ticks).abs().lte(0.5)).toBe(true);
        expect(cusp.ticks).toBeGreaterThanOrEqual(cuspShortForm.ticks);
      }),
    );
  });

  it("the feed for a wanted Ra gives no more than that Ra, and one percent more feed gives more", () => {
    fc.assert(
      fc.property(
        radius,
        fc.integer({ min: 1000, max: 60_000 }),
        fc.constantFrom("parabola" as const, "short form" as const),
        (r, wanted, form) => {
          const noseRadius = lengthOfTicks(r, "mm");
          const { feed } = feedForRoughness({ ra: lengthOfTicks(wanted, "um"), noseRadius, form });
          const key = form === "parabola" ? "ra" : "raShortForm";
          expect(turnedRoughness({ feed, noseRadius })[key].ticks).toBeLessThanOrEqual(wanted);
          const more = lengthOfTicks(Math.ceil(feed.ticks * 1.01), "mm");
          expect(turnedRoughness({ feed: more, noseRadius })[key].ticks).toBeGreaterThan(wanted);
        },
      ),
    );
  });
});

describe("tolerance and grade", () => {
  it("the preferred Ra keeps the rule, and the next coarser one breaks it", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 10_000, max: 20_000_000 }),
        fc.constantFrom("um" as const, "thou" as const),
        (width, written) => {
          for (const allowed of finishForTolerance(lengthOfTicks(width, written))) {
            if (allowed.ra === null || allowed.preferredRa === null) continue;
            const keeps = (one: Length): boolean =>
              allowed.below ? one.ticks < (allowed.ra?.ticks ?? 0) : one.ticks <= (allowed.ra?.ticks ?? 0);
            expect(keeps(allowed.preferredRa)).toBe(true);
            const next = roughness(allowed.preferredRa).coarser.firstChoice;
            if (next !== null) expect(keeps(next)).toBe(false);
          }
        },
      ),
    );
  });

  it("each grade's own tolerance amounts to that grade, in both systems", () => {
    const names = ["IT01", "IT0", ...Array.from({ length: 18 }, (_, index) => `IT${index + 1}`)] as GradeName[];
    fc.assert(
      fc.property(fc.integer({ min: 11_000_000, max: 4_900_000_000 }), fc.constantFrom(...names), (size, grade) => {
        const nominal = lengthOfTicks(size, "mm");
        const { tolerance } = standardTolerance(nominal, grade);
        const { iso } = gradeOfTolerance({ size: nominal, tolerance });
        expect(iso).toMatchObject({ exact: true, nearest: { grade }, within: { grade } });
        expect(iso?.processes.grade).toBe(grade === "IT01" ? -1 : Number(grade.slice(2)));
      }),
      { numRuns: 200 },
    );
    for (const grade of [4, 5, 6, 7, 8, 9, 10, 11, 12, 13] as const) {
      for (const size of ["0.1 in", "1 in", "5 in", "19 in"]) {
        const { tolerance } = inchStandardTolerance(size, grade);
        expect(gradeOfTolerance({ size, tolerance }).inch).toMatchObject({ exact: true, nearest: { grade } });
      }
    }
  });

  it("the nearest grade is nearest by ratio, and lies beside the tolerance", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 11_000_000, max: 4_900_000_000 }),
        fc.integer({ min: 1000, max: 200_000_000 }),
        (size, width) => {
          const { iso } = gradeOfTolerance({ size: lengthOfTicks(size, "mm"), tolerance: lengthOfTicks(width, "um") });
          if (iso === null) throw new Error("the size is in the system");
          const { within, beyond, nearest } = iso;
          if (within !== null) expect(within.tolerance.ticks).toBeLessThanOrEqual(width);
          if (beyond !== null) expect(beyond.tolerance.ticks).toBeGreaterThan(width);
          const distance = (one: { tolerance: Length } | null): number =>
            one === null ? Infinity : Math.abs(Math.log(one.tolerance.ticks / width));
          expect(distance(nearest)).toBeLessThanOrEqual(Math.min(distance(within), distance(beyond)) + 1e-12);
        },
      ),
    );
  });
});

describe("acceptance", () => {
  it("counts are right, and the maximum rule never accepts what the 16 % rule rejects", () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 1, max: 20_000 }), { minLength: 1, maxLength: 40 }),
        fc.integer({ min: 1, max: 20_000 }),
        (values, limit) => {
          const question = {
            upper: lengthOfTicks(limit, "um"),
            values: values.map((one) => lengthOfTicks(one, "uin")),
          };
          const share16 = acceptRoughness({ ...question, rule: "16 %" });
          const max = acceptRoughness({ ...question, rule: "maximum" });
          const over = values.filter((one) => one > limit).length;
          expect([share16.over, max.over]).toEqual([over, over]);
          expect(max.accepted).toBe(over === 0);
          expect(share16.accepted).toBe(over * 100 <= 16 * values.length);
        },
      ),
    );
  });
});

describe("lengths in inches", () => {
  it("a turned surface is the same in both unit systems, to half a tick", () => {
    fc.assert(
      fc.property(fc.integer({ min: 10, max: 100 }), fc.integer({ min: 1, max: 8 }), (tenths, sixteenths) => {
        const feed = lengthOfTicks(tenths * 25_400, "in");
        const noseRadius = lengthOfTicks(sixteenths * (TICKS.in / 64), "in");
        if (feed.ticks > 2 * noseRadius.ticks) return;
        const inches = turnedRoughness({ feed, noseRadius });
        const metric = turnedRoughness({ feed: mm(feed.to("mm")), noseRadius: mm(noseRadius.to("mm")) });
        expect(inches.ra.unit).toBe("uin");
        expect(metric.ra.unit).toBe("um");
        for (const key of ["rt", "rtOfCircle", "ra", "raShortForm", "rq"] as const) {
          expect(inches[key].ticks).toBe(metric[key].ticks);
        }
      }),
    );
  });
});
