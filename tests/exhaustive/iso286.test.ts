import { isoDeviations, isoFit, isoLimits, lengthOfTicks, parseToleranceClass } from "limitsmith";
import type { DeviationsUm, Length } from "limitsmith";
import { describe, expect, it } from "vitest";
import { thrown } from "../support/thrown.js";
import { classText, GRADES, LETTERS, MAIN_ENDS_MM, refusals, STEP_ENDS_MM } from "./definedness.js";

// The whole system: 28 letters, holes and shafts, 20 grades, at every edge of every size step.

const TICKS_PER_MM = 10_000_000;
const KINDS = [true, false] as const;

/** The first size of each step, its last one, and the edge at 1 mm. */
const SIZES: readonly Length[] = [
  ...new Set([
    1,
    TICKS_PER_MM - 1,
    TICKS_PER_MM,
    TICKS_PER_MM + 1,
    ...[0, ...STEP_ENDS_MM].map((end) => end * TICKS_PER_MM + 1),
    ...STEP_ENDS_MM.map((end) => end * TICKS_PER_MM),
    ...STEP_ENDS_MM.map((end) => end * TICKS_PER_MM - 1),
  ]),
]
  .filter((ticks) => ticks <= 3150 * TICKS_PER_MM)
  .sort((left, right) => left - right)
  .map((ticks) => lengthOfTicks(ticks, "mm"));

function mmOf(size: Length): number {
  return size.ticks / TICKS_PER_MM;
}

/** The deviations of a class where the standard has them, by the independent rules; `null` elsewhere. */
function defined(letter: string, hole: boolean, grade: number, size: Length): DeviationsUm | null {
  if (refusals(letter, hole, grade, mmOf(size), "2010").length > 0) return null;
  return isoDeviations(size, classText(letter, hole, grade));
}

describe.each(KINDS)("what is defined, hole: %s", (hole) => {
  describe.each(["2010", "1988"] as const)("edition %s", (edition) => {
    it.each(LETTERS)("%s", (letter) => {
      let refused = 0;
      let given = 0;
      for (const grade of GRADES) {
        const text = classText(letter, hole, grade);
        const cls = parseToleranceClass(text);
        expect(cls).toEqual({
          text,
          letter: hole ? letter.toUpperCase() : letter,
          grade: `IT${grade === -1 ? "01" : String(grade)}`,
          kind: hole ? "hole" : "shaft",
        });
        for (const size of SIZES) {
          const reasons = refusals(letter, hole, grade, mmOf(size), edition);
          if (reasons.length === 0) {
            given++;
            const { upperDeviationUm: upper, lowerDeviationUm: lower } = isoDeviations(size, cls, { edition });
            if (!Number.isFinite(upper) || !Number.isFinite(lower) || !(upper > lower)) {
              throw new Error(`${text} at ${size.toString()}: ${upper}/${lower}`);
            }
          } else {
            refused++;
            const error = thrown(() => isoDeviations(size, cls, { edition }));
            // the words say what is defined instead
            if (!reasons.some(({ code }) => code === error.code) || error.allowed === null) {
              throw new Error(`${text} at ${size.toString()}: ${error.code}, wanted ${JSON.stringify(reasons)}`);
            }
          }
        }
      }
      expect(given + refused).toBe(GRADES.length * SIZES.length);
      expect(given).toBeGreaterThan(0);
    });
  });
});

describe("the edges of the system", () => {
  it.each([0, -1, -25 * TICKS_PER_MM, 3150 * TICKS_PER_MM + 1, 4000 * TICKS_PER_MM])("refuses %d ticks", (ticks) => {
    const size = lengthOfTicks(ticks, "mm");
    for (const letter of LETTERS) {
      for (const hole of KINDS) {
        for (const grade of GRADES) {
          const cls = classText(letter, hole, grade);
          expect(thrown(() => isoDeviations(size, cls)).code).toBe("ISO_SIZE_OUT_OF_RANGE");
        }
      }
    }
  });

  it("takes 3150 mm itself and the smallest tick", () => {
    expect(isoLimits("3150 mm", "h7").min.toString()).toBe("3149.79 mm");
    expect(isoDeviations(lengthOfTicks(1, "mm"), "h7")).toEqual({ upperDeviationUm: 0, lowerDeviationUm: -10 });
  });
});

describe("limits agree with the grade", () => {
  it.each(GRADES)("max - min is the standard tolerance in every class, grade %d", (grade) => {
    let count = 0;
    for (const size of SIZES) {
      const width = defined("h", false, grade, size);
      for (const letter of LETTERS) {
        for (const hole of KINDS) {
          const um = defined(letter, hole, grade, size);
          if (um === null) continue;
          count++;
          const limits = isoLimits(size, classText(letter, hole, grade));
          const it = -(width?.lowerDeviationUm ?? NaN) * 10_000;
          const wrong =
            limits.max.ticks - limits.min.ticks !== it ||
            limits.tolerance.ticks !== it ||
            limits.max.ticks - size.ticks !== limits.upperDeviation.ticks ||
            limits.min.ticks - size.ticks !== limits.lowerDeviation.ticks ||
            limits.upperDeviation.ticks !== Math.round(um.upperDeviationUm * 10_000) ||
            limits.lowerDeviation.ticks !== Math.round(um.lowerDeviationUm * 10_000);
          if (wrong) throw new Error(`${limits.designation ?? ""} at ${size.toString()}`);
        }
      }
    }
    expect(count).toBeGreaterThan(500);
  });

  it("standard tolerances rise with the grade and never fall with the size", () => {
    for (const [index, size] of SIZES.entries()) {
      for (const grade of GRADES) {
        const here = defined("h", false, grade, size)?.lowerDeviationUm;
        const coarser = grade === 18 ? undefined : defined("h", false, grade + 1, size)?.lowerDeviationUm;
        if (here !== undefined && coarser !== undefined) expect(-coarser).toBeGreaterThan(-here);
        const next = SIZES[index + 1];
        const larger = next === undefined ? undefined : defined("h", false, grade, next)?.lowerDeviationUm;
        if (here !== undefined && larger !== undefined) expect(-larger).toBeGreaterThanOrEqual(-here);
      }
    }
  });

  it("IT12 to IT18 are ten times the grade five finer, in every step", () => {
    for (const end of MAIN_ENDS_MM) {
      for (let grade = 12; grade <= 18; grade++) {
        const coarse = isoDeviations(`${end} mm`, classText("h", false, grade)).lowerDeviationUm;
        const fine = isoDeviations(`${end} mm`, classText("h", false, grade - 5)).lowerDeviationUm;
        expect(coarse).toBe(10 * fine);
      }
    }
  });
});

describe("zero lines", () => {
  it("H begins and h ends on the nominal, as a plain zero", () => {
    for (const size of SIZES) {
      for (const grade of GRADES) {
        const hole = defined("h", true, grade, size);
        const shaft = defined("h", false, grade, size);
        if (hole !== null) expect(hole.lowerDeviationUm).toBe(0);
        if (shaft !== null) expect(shaft.upperDeviationUm).toBe(0);
      }
    }
  });

  it("js and JS lie evenly about the nominal", () => {
    for (const size of SIZES) {
      for (const grade of GRADES) {
        for (const hole of KINDS) {
          const um = defined("js", hole, grade, size);
          if (um !== null) expect(um.upperDeviationUm).toBe(-um.lowerDeviationUm);
        }
      }
    }
  });

  it("no deviation anywhere is a negative zero", () => {
    const found: string[] = [];
    for (const size of SIZES) {
      for (const letter of LETTERS) {
        for (const hole of KINDS) {
          for (const grade of GRADES) {
            const um = defined(letter, hole, grade, size);
            if (um !== null && (Object.is(um.upperDeviationUm, -0) || Object.is(um.lowerDeviationUm, -0))) {
              found.push(`${classText(letter, hole, grade)} at ${size.toString()}`);
            }
          }
        }
      }
    }
    expect(found.slice(0, 5)).toEqual([]);
  });
});

describe("order of the letters", () => {
  it("shafts a to h come nearer the nominal, k to zc go beyond it, in every grade", () => {
    let compared = 0;
    for (const size of SIZES) {
      for (const grade of GRADES) {
        let before = -Infinity;
        for (const letter of LETTERS) {
          if (letter === "js" || letter === "j") continue;
          const um = defined(letter, false, grade, size);
          if (um === null) continue;
          const own = LETTERS.indexOf(letter) <= LETTERS.indexOf("h") ? um.upperDeviationUm : um.lowerDeviationUm;
          // h ends at zero and k may begin there: the one place where two letters can share a value
          const ordered = letter === "k" ? own >= before : own > before;
          if (!ordered)
            throw new Error(`${classText(letter, false, grade)} at ${size.toString()}: ${own} after ${before}`);
          before = own;
          compared++;
        }
      }
    }
    expect(compared).toBeGreaterThan(30_000);
  });

  it("a fundamental deviation never comes nearer the nominal as the size grows", () => {
    for (const letter of LETTERS) {
      // k goes back to zero over 500 mm, j has no rule
      if (letter === "js" || letter === "j" || letter === "k") continue;
      let before = 0;
      for (const size of SIZES) {
        const um = defined(letter, false, 7, size);
        if (um === null) continue;
        const own = Math.min(Math.abs(um.upperDeviationUm), Math.abs(um.lowerDeviationUm));
        expect(own).toBeGreaterThanOrEqual(before);
        before = own;
      }
    }
  });
});

describe("holes from shafts", () => {
  it("A to H mirror a to h about the nominal", () => {
    for (const letter of LETTERS.slice(0, LETTERS.indexOf("h") + 1)) {
      for (const size of SIZES) {
        for (const grade of GRADES) {
          const hole = defined(letter, true, grade, size);
          const shaft = defined(letter, false, grade, size);
          expect(hole === null).toBe(shaft === null);
          if (hole === null || shaft === null) continue;
          if (hole.lowerDeviationUm + shaft.upperDeviationUm !== 0) {
            throw new Error(`${classText(letter, true, grade)} at ${size.toString()}`);
          }
        }
      }
    }
  });

  it("K, M, N to IT8 and P to ZC to IT7 over 3 to 500 mm carry delta = ITn - IT(n-1)", () => {
    let count = 0;
    for (const letter of LETTERS.slice(LETTERS.indexOf("k"))) {
      const coarsest = letter === "k" || letter === "m" || letter === "n" ? 8 : 7;
      for (const size of SIZES) {
        if (mmOf(size) <= 3 || mmOf(size) > 500) continue;
        for (let grade = 3; grade <= coarsest; grade++) {
          const hole = defined(letter, true, grade, size);
          // the shaft value is that of grades 4 to 7, which is the same in all of them
          const shaft = defined(letter, false, 7, size);
          if (hole === null || shaft === null) continue;
          const it = -(defined("h", false, grade, size)?.lowerDeviationUm ?? NaN);
          const finer = -(defined("h", false, grade - 1, size)?.lowerDeviationUm ?? NaN);
          // ISO 286-1, Table 2, note: M6 over 250 to 315 mm has -9, not -11
          const special = letter === "m" && grade === 6 && mmOf(size) > 250 && mmOf(size) <= 315;
          const wanted = special ? -9 : -shaft.lowerDeviationUm + it - finer;
          if (hole.upperDeviationUm !== wanted) {
            throw new Error(`${classText(letter, true, grade)} at ${size.toString()}: not ${wanted}`);
          }
          count++;
        }
      }
    }
    expect(count).toBeGreaterThan(4000);
  });

  it("coarser grades, sizes to 3 mm and over 500 mm carry no delta", () => {
    let count = 0;
    for (const letter of LETTERS.slice(LETTERS.indexOf("k"))) {
      const coarsest = letter === "k" || letter === "m" || letter === "n" ? 8 : 7;
      for (const size of SIZES) {
        const inside = mmOf(size) > 3 && mmOf(size) <= 500;
        for (const grade of GRADES) {
          if (inside && grade <= coarsest) continue;
          const hole = defined(letter, true, grade, size);
          const shaft = defined(letter, false, 7, size);
          if (hole === null || shaft === null) continue;
          // ISO 286-1, Table 3: N above IT8 over 3 to 500 mm ends on the nominal
          const wanted = inside && letter === "n" ? 0 : -shaft.lowerDeviationUm + 0;
          if (hole.upperDeviationUm !== wanted) {
            throw new Error(`${classText(letter, true, grade)} at ${size.toString()}: not ${wanted}`);
          }
          count++;
        }
      }
    }
    expect(count).toBeGreaterThan(8000);
  });

  it("over 3 to 500 mm a grade 7 hole on a grade 6 shaft gives one clearance on either basis", () => {
    for (const letter of LETTERS.slice(LETTERS.indexOf("k"))) {
      for (const size of SIZES) {
        if (mmOf(size) <= 3 || mmOf(size) > 500 || defined(letter, false, 6, size) === null) continue;
        const holeBasis = isoFit(size, `H7/${letter}6`);
        const shaftBasis = isoFit(size, `${letter.toUpperCase()}7/h6`);
        expect(shaftBasis.maxClearance.ticks).toBe(holeBasis.maxClearance.ticks);
        expect(shaftBasis.minClearance.ticks).toBe(holeBasis.minClearance.ticks);
      }
    }
  });
});

describe("k", () => {
  it("stands off the nominal in grades 4 to 7 only, over 3 to 500 mm only", () => {
    for (const size of SIZES) {
      for (const grade of GRADES) {
        const um = defined("k", false, grade, size);
        if (um === null) continue;
        const stands = grade >= 4 && grade <= 7 && mmOf(size) > 3 && mmOf(size) <= 500;
        expect(um.lowerDeviationUm > 0).toBe(stands);
        if (!stands) expect(um.lowerDeviationUm).toBe(0);
      }
    }
  });
});

describe("the even rounding of js, a note of 1988", () => {
  it("drops an odd grade of js7 to js11 and JS7 to JS11 by one micrometre, and touches nothing else", () => {
    let dropped = 0;
    for (const size of SIZES) {
      for (const letter of LETTERS) {
        for (const hole of KINDS) {
          for (const grade of GRADES) {
            const exact = defined(letter, hole, grade, size);
            if (exact === null) continue;
            const even = isoDeviations(size, classText(letter, hole, grade), { jsRounding: "even" });
            const odd = letter === "js" && grade >= 7 && grade <= 11 && !Number.isInteger(exact.upperDeviationUm);
            const by = odd ? 0.5 : 0;
            if (odd) dropped++;
            if (
              even.upperDeviationUm !== exact.upperDeviationUm - by ||
              even.lowerDeviationUm !== exact.lowerDeviationUm + by
            ) {
              throw new Error(`${classText(letter, hole, grade)} at ${size.toString()}`);
            }
          }
        }
      }
    }
    expect(dropped).toBeGreaterThan(100);
  });
});

describe("no float noise", () => {
  const UM = /^-?\d{1,6}(?:\.\d{1,2})?$/;
  // a long run of nines or zeros behind the point is what binary fractions leave behind
  const NOISE = /\.\d*(?:0{6}|9{6})/;

  it("in the µm of any class", () => {
    for (const size of SIZES) {
      for (const letter of LETTERS) {
        for (const hole of KINDS) {
          for (const grade of GRADES) {
            const um = defined(letter, hole, grade, size);
            if (um === null) continue;
            if (!UM.test(`${um.upperDeviationUm}`) || !UM.test(`${um.lowerDeviationUm}`)) {
              throw new Error(`${classText(letter, hole, grade)} at ${size.toString()}: ${JSON.stringify(um)}`);
            }
          }
        }
      }
    }
  });

  it("in the JSON of any limits, metric and inch", () => {
    let count = 0;
    for (const [index, end] of STEP_ENDS_MM.entries()) {
      const low = STEP_ENDS_MM[index - 1] ?? 0;
      const metric = lengthOfTicks(((low + end) / 2) * TICKS_PER_MM, "mm");
      // a size in the step that inches write exactly
      const inches = lengthOfTicks(Math.ceil((low * TICKS_PER_MM + 1) / 254_000) * 254_000, "in");
      for (const size of [metric, inches]) {
        for (const letter of LETTERS) {
          for (const hole of KINDS) {
            for (const grade of GRADES) {
              if (defined(letter, hole, grade, size) === null) continue;
              const text = JSON.stringify(isoLimits(size, classText(letter, hole, grade)));
              if (NOISE.test(text) || /\d(?:\.\d+)?e[+-]?\d|NaN|undefined|Infinity|"-0[. ]?0* /.test(text))
                throw new Error(text);
              count++;
            }
          }
        }
      }
    }
    expect(count).toBeGreaterThan(30_000);
  });
});
