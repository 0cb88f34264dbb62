// `npm run bench`: how fast the library is, as ratios to baselines that are written out beside this file.
// Everything runs on dist, as users have it. Times depend on the machine, ratios much less; nothing fails here.

import { Decimal } from "decimal.js";
import { inch, inchFit, isoDeviations, isoFit, mm, parseToleranceClass } from "limitsmith";
import { Bench } from "tinybench";
import { bareSearch } from "./bareSearch.js";
import { coldImports } from "./coldImport.js";
import { decimalFit } from "./decimalFit.js";
import { nativeLookup, sqlJsLookup } from "./sqlLookup.js";

const FIT = "H7/m6";
const FITS = ["H7/m6", "H7/h6", "H8/f7", "H7/p6", "K7/h6", "H9/d9", "G7/h6", "N7/h6"];
const CLASSES = [...new Set(FITS.flatMap((fit) => fit.split("/")))];

// 1000 sizes spread over 3 to 500 mm: far too many to be guessed by a branch predictor, all different
const SIZES_MM = Array.from({ length: 1000 }, (_, index) => 3 + ((index * 7919) % 497_000) / 1000);
const SIZES = SIZES_MM.map((size) => mm(size));
const INCHES = Array.from({ length: 1000 }, (_, index) => inch(0.25 + ((index * 7919) % 18_000) / 1000));
const DECIMALS = SIZES_MM.map((size) => new Decimal(size));

// every call adds to this, and it is printed: no compiler may leave a call out
let sink = 0;

const m6 = parseToleranceClass("m6");
const bare = bareSearch("m6");
const withDecimals = decimalFit(CLASSES);
const sqlJs = await sqlJsLookup(CLASSES);
const native = await nativeLookup(CLASSES);

const bench = new Bench({ time: 800, warmupTime: 300 });

bench.add("bare search", () => {
  for (const size of SIZES_MM) sink += bare(size);
});
bench.add("isoDeviations", () => {
  for (const size of SIZES) {
    const { upperDeviationUm, lowerDeviationUm } = isoDeviations(size, m6);
    sink += upperDeviationUm + lowerDeviationUm;
  }
});
bench.add("isoFit", () => {
  for (const size of SIZES) sink += isoFit(size, FIT).maxClearance.ticks;
});
bench.add("isoFit, eight fits", () => {
  SIZES.forEach((size, index) => {
    sink += isoFit(size, FITS[index % FITS.length] ?? FIT).maxClearance.ticks;
  });
});
bench.add("inchFit", () => {
  for (const size of INCHES) sink += inchFit(size, "LN2").maxClearance.ticks;
});
bench.add("sql.js", () => {
  for (const size of SIZES_MM) sink += sqlJs(size, "m6");
});
if (native !== null) {
  bench.add("better-sqlite3", () => {
    for (const size of SIZES_MM) sink += native(size, "m6");
  });
}
bench.add("Decimal fit", () => {
  for (const size of DECIMALS) sink += withDecimals(size, FIT).maxClearance.toNumber();
});

await bench.run();

/** Nanoseconds of one call: the median pass over all sizes. */
function nsOf(name: string): number {
  const result = bench.getTask(name)?.result;
  if (result?.state !== "completed") throw new Error(`${name} did not complete`);
  return (result.latency.p50 * 1e6) / SIZES.length;
}

interface Line {
  readonly what: string;
  readonly ratio: number;
  readonly target: string;
  readonly met: boolean | null;
  readonly times: string;
}

function slower(name: string, baseline: string, most: number): Line {
  const [own, base] = [nsOf(name), nsOf(baseline)];
  const ratio = own / base;
  const times = `${own.toFixed(1)} ns : ${base.toFixed(1)} ns`;
  return { what: `${name} : ${baseline}`, ratio, target: `at most ${most}`, met: ratio <= most, times };
}

function faster(name: string, baseline: string, least: number | null): Line {
  const [own, base] = [nsOf(name), nsOf(baseline)];
  const ratio = base / own;
  const times = `${base.toFixed(0)} ns : ${own.toFixed(0)} ns`;
  const target = least === null ? "-" : `at least ${least}`;
  return { what: `${baseline} : ${name}`, ratio, target, met: least === null ? null : ratio >= least, times };
}

function cold(kind: "import" | "require", most: number | null): Line {
  const [own = 0, base = 1] = coldImports(["limitsmith", "decimal.js"], kind);
  const ratio = own / base;
  const times = `${own.toFixed(2)} ms : ${base.toFixed(2)} ms`;
  const target = most === null ? "-" : `at most ${most}`;
  return {
    what: `cold ${kind} of limitsmith : decimal.js`,
    ratio,
    target,
    met: most === null ? null : ratio <= most,
    times,
  };
}

const lines: Line[] = [
  slower("isoDeviations", "bare search", 3),
  faster("isoFit", "sql.js", 3),
  ...(native === null ? [] : [faster("isoFit", "better-sqlite3", 3)]),
  faster("isoFit, eight fits", "sql.js", null),
  faster("isoFit", "Decimal fit", null),
  slower("inchFit", "isoFit", 1.5),
  cold("import", 2),
  cold("require", null),
];

console.log(`${"what".padEnd(42)}${"ratio".padStart(8)}  ${"target".padEnd(12)}${"met".padEnd(5)}times`);
for (const { what, ratio, target, met, times } of lines) {
  const verdict = met === null ? "-" : met ? "yes" : "no";
  console.log(`${what.padEnd(42)}${ratio.toFixed(2).padStart(8)}  ${target.padEnd(12)}${verdict.padEnd(5)}${times}`);
}
if (native === null) console.log("(better-sqlite3 is not installed, so there is no figure for native SQLite)");
console.log(`checksum ${sink.toExponential(6)}`);
