import { resolveCallout } from "../callout/index.js";
import type { CalloutContext } from "../callout/index.js";
import { LimitsError } from "../errors.js";
import { keyseatFindings, keyseatRows } from "../keys/index.js";
import type { KeyseatSpec, PrintedKeyseat } from "../keys/index.js";
import type { Limits } from "../limits/index.js";
import { atPath } from "../located.js";
import { limitsOfRow } from "./readRow.js";
import type { KeyseatFields } from "./sheetSpec.js";
import type { ResolvedKeyseat, SheetFinding, SheetRow } from "./sheetValue.js";

/** Works a keyseat out from the feature that it is cut into. */
export function resolveKeyseat(
  fields: KeyseatFields,
  rows: ReadonlyMap<string, SheetRow>,
  context: CalloutContext,
): ResolvedKeyseat {
  const { on, printed = {}, ...spec } = fields;
  const row = rows.get(on);
  const limits = row === undefined ? null : limitsOfRow(row);
  if (row === undefined || limits === null) {
    throw new LimitsError("KEYSEAT_ON_UNKNOWN", "the keyseat is on no feature with limits", {
      value: on,
      allowed: "the id of a shaft or bore that resolves",
      path: ["on"],
    });
  }
  const member = fields.member ?? memberOf(row);
  const seat = keyseatRows(limits.nominal, asSpec({ ...spec, member }));
  const print = (name: "control" | "width"): Limits | null => {
    const text = printed[name];
    return text === undefined ? null : atPath(["printed", name], () => limitsOfText(text, context));
  };
  return Object.freeze({
    outcome: "keyseat",
    on,
    seat,
    printed: Object.freeze({ control: print("control"), width: print("width") }),
  });
}

/** The fields of a file are any texts and numbers; the function behind checks each and refuses by code. */
function asSpec(fields: object): KeyseatSpec {
  return fields as KeyseatSpec;
}

/** Findings of a keyseat: printed limits that are not the standard's. */
export function findingsOfKeyseat(id: string, { on, seat, printed }: ResolvedKeyseat): readonly SheetFinding[] {
  const given: PrintedKeyseat = {
    ...(printed.control === null ? {} : { control: printed.control }),
    ...(printed.width === null ? {} : { width: printed.width }),
  };
  return keyseatFindings(seat, given).map(({ code, says, printed: found, standard }) =>
    Object.freeze({
      code,
      severity: "error",
      features: Object.freeze([id, on]),
      says: `${says} (${seat.standard})`,
      found: `${found.max.toString()} / ${found.min.toString()}`,
      expected: standard === null ? null : `${standard.max.toString()} / ${standard.min.toString()}`,
      settle: "print the limits of the standard, or name another standard, class or key",
    }),
  );
}

function memberOf(row: SheetRow): "shaft" | "hub" {
  if (row.kind !== null) return row.kind === "hole" ? "hub" : "shaft";
  throw new LimitsError("KEYSEAT_ON_UNKNOWN", "it is not said whether the keyseat is in a shaft or a hub", {
    value: row.id,
    allowed: 'member "shaft" or "hub", or a kind at the feature',
    path: ["member"],
  });
}

function limitsOfText(text: string, context: CalloutContext): Limits {
  const resolved = resolveCallout(text, context);
  if (resolved.outcome === "limits") return resolved.limits;
  throw new LimitsError("CALLOUT_NOT_UNDERSTOOD", "a size with limits is needed here", {
    value: text,
    allowed: "such as 1.289/1.274 or .375 +.002/-.000",
  });
}
