import { LimitsError, attempt } from "../errors.js";
import { fitOf } from "../limits/index.js";
import type { Fit, Limits } from "../limits/index.js";
import { equalLengths } from "../units/index.js";
import type { ReadRow } from "./readRow.js";
import type { SheetFit } from "./sheetValue.js";

interface Member {
  readonly id: string;
  readonly kind: "hole" | "shaft" | null;
  readonly limits: Limits | null;
  /** The fit that the callout names, where it names one. */
  readonly fit: Fit | null;
  /** True where the callout states a nominal size, false for two limits. */
  readonly hasNominal: boolean;
}

/** Works out the fit of each pair of mates, once a pair, in the order in which the pairs are first named. */
export function resolveMates(read: readonly ReadRow[]): readonly SheetFit[] {
  const members = new Map<string, Member>();
  // the first feature of an id is the one that counts
  for (const one of read)
    if (one.spec !== null && !members.has(one.spec.id)) members.set(one.spec.id, memberOf(one, one.spec.id));
  const done = new Set<string>();
  const fits: SheetFit[] = [];
  for (const { spec, row } of read) {
    if (spec === null || !("callout" in spec) || spec.mate === undefined) continue;
    const { id, mate } = spec;
    const pair = JSON.stringify([id, mate].sort());
    if (done.has(pair)) continue;
    done.add(pair);
    fits.push(mateOf(members, id, mate, ["features", row.index, "mate"]));
  }
  return Object.freeze(fits);
}

function memberOf({ row }: ReadRow, id: string): Member {
  const resolved = row.ok && row.resolved.outcome === "limits" ? row.resolved : null;
  return {
    id,
    kind: row.kind,
    limits: resolved?.limits ?? null,
    fit: resolved?.fit ?? null,
    hasNominal: resolved?.request.kind !== "limits",
  };
}

function mateOf(
  members: ReadonlyMap<string, Member>,
  id: string,
  mate: string,
  path: readonly (string | number)[],
): SheetFit {
  const found = attempt(() => {
    const first = members.get(id);
    const second = members.get(mate);
    if (first === undefined || second === undefined || id === mate) {
      throw new LimitsError("MATE_UNKNOWN", "the mate is not another feature of this drawing", {
        value: mate,
        allowed: "the id of another feature",
        path,
      });
    }
    for (const one of [first, second]) {
      if (one.limits === null) {
        throw new LimitsError("MATE_UNRESOLVED", "one of the mates has no limits", {
          value: one.id,
          allowed: "two features with limits",
          path,
        });
      }
    }
    const hole = [first, second].find((one) => one.kind === "hole");
    const shaft = [first, second].find((one) => one.kind === "shaft");
    if (hole?.limits == null || shaft?.limits == null) {
      throw new LimitsError("MATE_KIND_INVALID", "mates are one hole and one shaft", {
        value: `${first.id}: ${first.kind ?? "not said"}, ${second.id}: ${second.kind ?? "not said"}`,
        allowed: 'kind "hole" at one and "shaft" at the other, or classes that tell',
        path,
      });
    }
    const nominals = hole.hasNominal && shaft.hasNominal ? "same" : "any";
    return {
      hole: hole.id,
      shaft: shaft.id,
      fit: namedFit(hole, shaft) ?? fitOf(hole.limits, shaft.limits, { nominals }),
    };
  });
  return Object.freeze(
    found.ok
      ? { ok: true as const, ...found.value }
      : { ok: false as const, features: Object.freeze([id, mate] as const), error: found.error },
  );
}

/** The fit that both callouts name, with all that it says, where they name the same one on the same size. */
function namedFit(hole: Member, shaft: Member): Fit | null {
  if (hole.fit === null || shaft.fit === null) return null;
  const same = hole.fit.designation === shaft.fit.designation && equalLengths(hole.fit.nominal, shaft.fit.nominal);
  return same ? hole.fit : null;
}
