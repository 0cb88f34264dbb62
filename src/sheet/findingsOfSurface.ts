import { checkFinish, gradeFindings } from "../finish/index.js";
import type { FinishFinding } from "../finish/index.js";
import { parseToleranceClass } from "../iso286/index.js";
import type { Limits } from "../limits/index.js";
import { limitsOfRow } from "./readRow.js";
import type { SheetFinding, SheetRow, SheetSurface } from "./sheetValue.js";

const SEVERE: ReadonlySet<string> = new Set([
  "FINISH_TOO_COARSE_FOR_TOLERANCE",
  "FINISH_TOO_COARSE_FOR_FUNCTION",
  "FINISH_TOO_FINE_FOR_FUNCTION",
  "FINISH_NEEDS_LOWER_LIMIT",
  "PROCESS_DOES_NOT_REACH_FINISH",
  "PROCESS_DOES_NOT_REACH_GRADE",
]);

const SETTLE: ReadonlyMap<string, string> = new Map([
  ["FINISH_TOO_COARSE_FOR_TOLERANCE", "a finer finish, or a wider tolerance"],
  ["FINISH_TOO_COARSE_FOR_FUNCTION", "a finer finish, or a statement that this one serves"],
  ["FINISH_TOO_FINE_FOR_FUNCTION", "a coarser finish, or a statement that this one serves"],
  ["FINISH_NEEDS_LOWER_LIMIT", "a lower limit beside the upper one"],
  ["FINISH_FINER_THAN_NEEDED", "a coarser finish, if nothing else needs this one"],
  ["PROCESS_DOES_NOT_REACH_FINISH", "another process, or a coarser finish"],
  ["PROCESS_SELDOM_REACHES_FINISH", "the shop's word that it holds this finish"],
  ["PROCESS_FINER_THAN_FINISH_NEEDS", "a cheaper process, if nothing else needs this one"],
  ["PROCESS_DOES_NOT_REACH_GRADE", "another process, or a coarser grade"],
  ["PROCESS_GRADE_DISPUTED", "the shop's word that it holds this grade"],
  ["PROCESS_FINER_THAN_GRADE_NEEDS", "a cheaper process, if nothing else needs this one"],
]);

/** Findings of a surface: finish against tolerance, function and process, and process against the grade. */
export function findingsOfSurface(row: SheetRow): readonly SheetFinding[] {
  if (!row.ok || row.surface === null || row.id === null) return [];
  const { id } = row;
  return look(row.surface, limitsOfRow(row), gradeOf(row)).map(({ code, says }) =>
    Object.freeze({
      code,
      severity: SEVERE.has(code) ? "warning" : "note",
      features: Object.freeze([id]),
      says,
      found: null,
      expected: null,
      settle: SETTLE.get(code) ?? "a look by the designer",
    }),
  );
}

function look(surface: SheetSurface, limits: Limits | null, grade: string | null): readonly FinishFinding[] {
  const { finish, process } = surface;
  if (finish === null) return process === null || grade === null ? [] : gradeFindings(grade, process);
  return checkFinish({
    roughness: finish,
    ...(limits === null ? {} : { tolerance: limits.tolerance }),
    ...(surface.function === null ? {} : { function: surface.function }),
    ...(process === null ? {} : { process }),
    ...(grade === null ? {} : { grade }),
  });
}

/** The grade of a row: that of its ISO class; `null` where it has none. */
function gradeOf(row: SheetRow): string | null {
  if (!row.ok || row.resolved.outcome !== "limits") return null;
  const { request } = row.resolved;
  if (request.kind === "class") return parseToleranceClass(request.toleranceClass).grade;
  if (request.kind !== "fit" || row.kind === null) return null;
  const [hole = "", shaft = ""] = request.fit.split("/");
  return parseToleranceClass(row.kind === "hole" ? hole : shaft).grade;
}
