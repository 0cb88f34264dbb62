// Resolves a drawing file and prints its limits in both units: `npm start`, or `npm start -- path/to/drawing.json`.
import { readFile } from "node:fs/promises";
import { fileURLToPath } from "node:url";
import { attempt, convertLimits, writeLength, writeLimits } from "limitsmith";
import { resolveSheet } from "limitsmith/sheet";

const EXIT_ROW_FAILED = 1;
const EXIT_NO_DRAWING = 2;
const ownDrawing = fileURLToPath(new URL("./drawing.json", import.meta.url));

/** Ends the program with one line for a person. */
function giveUp(line) {
  console.error(line);
  process.exit(EXIT_NO_DRAWING);
}

async function readDrawing(path) {
  let text;
  try {
    text = await readFile(path, "utf8");
  } catch (error) {
    giveUp(`cannot read ${path}: ${error.code === "ENOENT" ? "there is no such file" : error.message}`);
  }
  try {
    return JSON.parse(text);
  } catch (error) {
    giveUp(`${path} is not JSON: ${error.message}`);
  }
}

/** Max and min in one unit; in the other system rounded inside (method B), which a star marks. */
function bothLimits(limits, unit) {
  const converted = attempt(() => convertLimits(limits, unit, { method: "B" }));
  // the rule of conversion has no fineness for very wide and very narrow tolerances
  if (!converted.ok) return "no rule of rounding";
  const { maxShift, minShift } = converted.value;
  const { text } = writeLimits(converted.value.limits, { form: "limits", unit });
  return maxShift.ticks === 0 && minShift.ticks === 0 ? text : `${text} *`;
}

function deviations({ upperDeviation, lowerDeviation }) {
  const inMicrometres = (length) => writeLength(length, { unit: "um", places: 2, sign: "always", symbol: false });
  return `${inMicrometres(upperDeviation)} / ${inMicrometres(lowerDeviation)}`;
}

function source(basis) {
  return basis
    .filter((step) => step.how !== "derived")
    .map((step) => `${step.standard}, ${step.place}`)
    .slice(0, 2)
    .join("; ");
}

/** The lines of the table for one row: one, or one for each dimension of a keyseat. */
function linesOf(row) {
  const head = [row.id ?? `#${row.index}`, row.name ?? "", row.callout ?? ""];
  if (!row.ok) return [[...head, "", "", "", "", "", `${row.error.code}: ${row.error.message}`]];
  if (row.resolved.outcome === "keyseat") return keyseatLines(head, row.resolved.seat);
  const [id, name, callout, ...rest] = cells(head, row.resolved);
  const from = rest.pop();
  const finish = row.surface?.finish;
  return [[id, name, callout, ...rest, finish == null ? "" : `Ra ${finish.value}`, from]];
}

function keyseatLines([id, name], seat) {
  return seat.rows.map(({ symbol, limits }) =>
    limits === null
      ? [id, name, symbol, "-", "", "no limits in the standard", "", "", seat.standard]
      : [
          id,
          name,
          symbol,
          "-",
          deviations(limits),
          bothLimits(limits, "in"),
          bothLimits(limits, "mm"),
          "",
          seat.standard,
        ],
  );
}

function cells(head, resolved) {
  switch (resolved.outcome) {
    case "limits": {
      const { limits } = resolved;
      return [
        ...head,
        limits.designation ?? "-",
        deviations(limits),
        bothLimits(limits, "in"),
        bothLimits(limits, "mm"),
        source(limits.basis),
      ];
    }
    case "single limit": {
      const { kind, limit } = resolved.single;
      const show = (unit, places) =>
        `${kind} ${writeLength(limit, { unit, places, symbol: false, rounding: kind === "max" ? "down" : "up" })}`;
      return [...head, "-", "", show("in", 4), show("mm", 3), "the drawing, callout"];
    }
    case "chamfer": {
      const { limits, angle } = resolved;
      const angles = `${angle.max}/${angle.min}`;
      return [
        ...head,
        "-",
        deviations(limits),
        `${bothLimits(limits, "in")}  ${angles}`,
        bothLimits(limits, "mm"),
        source(limits.basis),
      ];
    }
    case "angle": {
      const { angle } = resolved;
      return [...head, "-", "", `${angle.max} / ${angle.min}`, "", source(angle.basis) || "title block of the drawing"];
    }
    case "fit":
      return [...head, resolved.fit.designation ?? "-", "", "", "", "a fit; say hole or shaft to see its limits"];
    default:
      return [...head, "-", "", "", "", resolved.reason];
  }
}

function printTable(header, lines) {
  const widths = header.map((title, column) => Math.max(title.length, ...lines.map((line) => line[column].length)));
  const show = (line) =>
    console.log(
      line
        .map((cell, column) => cell.padEnd(widths[column]))
        .join("  ")
        .trimEnd(),
    );
  show(header);
  show(widths.map((width) => "-".repeat(width)));
  lines.forEach(show);
}

function printFits(fits) {
  for (const one of fits) {
    if (!one.ok) {
      console.log(`${one.features.join(" + ")}: ${one.error.code}: ${one.error.message}`);
      continue;
    }
    const { fit, hole, shaft } = one;
    const show = (unit, places) =>
      [fit.minClearance, fit.maxClearance]
        .map((length) => writeLength(length, { unit, places, sign: "always", symbol: false }))
        .join(" to ");
    console.log(
      `${hole} on ${shaft}: ${fit.kind} fit${fit.designation === null ? "" : ` ${fit.designation}`}, ` +
        `clearance ${show("thou", 2)} thou (${show("um", 1)} µm; minus is interference)`,
    );
  }
  const cautions = fits.flatMap((one) => (one.ok ? one.fit.cautions : []));
  for (const says of new Set(cautions.map((caution) => caution.says))) console.log(`caution: ${says}`);
}

const path = process.argv[2] ?? ownDrawing;
const json = await readDrawing(path);
let sheet;
try {
  sheet = resolveSheet(json);
} catch (error) {
  const where = error.path?.length > 0 ? ` at ${error.path.join(".")}` : "";
  giveUp(`${path} is not a drawing${where}: ${error.message}`);
}

console.log(`${sheet.drawing}\n`);
printTable(
  ["id", "feature", "callout", "class", "deviations, µm", "max/min, in", "max/min, mm", "finish", "source"],
  sheet.rows.flatMap(linesOf),
);
console.log("\n* rounded inside: no part that the exact limits reject is accepted\n");
printFits(sheet.fits);
for (const { code, severity, features, says, settle } of sheet.findings) {
  console.log(`\n${severity} ${code} (${features.join(", ")}): ${says}\n    settle it by: ${settle}`);
}
for (const problem of sheet.problems) console.log(`\nproblem: ${problem.code}: ${problem.message}`);
for (const key of sheet.unknownKeys) console.log(`\nnot known, passed over: ${key.join(".")}`);
const { features, failed, fits, fitsFailed } = sheet.counts;
console.log(`\n${features} features, ${failed} failed; ${fits + fitsFailed} fits, ${fitsFailed} failed`);
if (failed + fitsFailed + sheet.problems.length > 0) process.exitCode = EXIT_ROW_FAILED;
