// A caller's TypeScript: compiled, never run, against the package as installed; see ../typed.mjs.
// It must say the same as an ES module, as a CommonJS module, and for a bundler.

import {
  LimitsError,
  attempt,
  fitOf,
  inch,
  isoFit,
  isoLimits,
  mm,
  readCallout,
  resolveCallout,
  titleBlock,
  toDecimal,
  um,
  writeLimits,
} from "limitsmith";
import type { Basis, BasisStep, CalloutRequest, Fit, Length, Limits, LimitsProblem, ResolvedCallout } from "limitsmith";
import * as calloutRoom from "limitsmith/callout";
import { LimitsError as LimitsErrorOfErrors } from "limitsmith/errors";
import type { ErrorCode } from "limitsmith/errors";
import { isoDeviations } from "limitsmith/iso286";
import type { DeviationsUm, GradeName } from "limitsmith/iso286";
import { limits } from "limitsmith/limits";
import type { Limits as LimitsOfRoom } from "limitsmith/limits";
import { sheetJsonSchema } from "limitsmith/schemas";
import { resolveSheet } from "limitsmith/sheet";
import type { ResolvedSheet, SheetRow, SheetSpec } from "limitsmith/sheet";
import { defaultLimits } from "limitsmith/titleBlock";
import type { TitleBlock } from "limitsmith/titleBlock";
import { readLength } from "limitsmith/units";
import type { LengthUnit, Length as LengthOfRoom } from "limitsmith/units";

type Equal<A, B> = (<T>() => T extends A ? 1 : 2) extends <T>() => T extends B ? 1 : 2 ? true : false;

/** Compiles only where the two types are the same; `any` is the same as nothing else. */
function same<A, B>(answer: Equal<A, B>): void {
  void answer;
}

const seat = isoLimits(mm(25), "k5");
same<typeof seat, Limits>(true);
same<Limits, LimitsOfRoom>(true);
same<Length, LengthOfRoom>(true);
same<typeof LimitsError, typeof LimitsErrorOfErrors>(true);
same<Limits["max"], Length>(true);
same<Limits["upperDeviation"], Length>(true);
same<Limits["designation"], string | null>(true);
same<Limits["basis"], Basis>(true);
same<Basis, readonly BasisStep[]>(true);
same<Length["ticks"], number>(true);
same<Length["unit"], LengthUnit>(true);
same<LengthUnit, "mm" | "um" | "in" | "thou" | "uin">(true);
same<ReturnType<Length["to"]>, number>(true);
same<Length, string>(false);

const fit = isoFit(inch("1 1/4"), "H7/k6");
same<typeof fit, Fit>(true);
same<Fit["kind"], "clearance" | "transition" | "interference">(true);
same<ReturnType<typeof fitOf>, Fit>(true);
same<ReturnType<typeof limits>, Limits>(true);
same<ReturnType<typeof isoDeviations>, DeviationsUm>(true);
same<DeviationsUm["upperDeviationUm"], number>(true);
same<Extract<GradeName, "IT7">, "IT7">(true);
same<ReturnType<typeof readLength>, Length>(true);

const decimal = toDecimal(seat.max, "in");
const digits: string = decimal.toFixed(5);
const sum = decimal.plus(1);
same<typeof sum, typeof decimal>(true);

const tried = attempt(() => isoLimits("40 mm", "m6"));
if (tried.ok) same<typeof tried.value, Limits>(true);
else {
  same<typeof tried.error, LimitsProblem>(true);
  same<typeof tried.error.code, ErrorCode>(true);
}

same<ReturnType<typeof readCallout>, CalloutRequest>(true);
same<typeof calloutRoom.readCallout, typeof readCallout>(true);
const resolved: ResolvedCallout = resolveCallout("⌀40 m6", { unit: "mm" });
if (resolved.outcome === "limits") same<typeof resolved.limits, Limits>(true);
const block: TitleBlock = titleBlock({ unit: "in", decimals: { 3: "±.005" } });
const defaults = defaultLimits(block, "2.188");
if (defaults.kind === "length") same<typeof defaults.limits, Limits>(true);

const spec: SheetSpec = { drawing: "Shaft", unit: "mm", features: [{ id: "A", callout: "⌀40 m6" }] };
const sheet: ResolvedSheet = resolveSheet(spec);
same<typeof sheet.rows, readonly SheetRow[]>(true);
for (const row of sheet.rows) if (!row.ok) same<typeof row.error, LimitsProblem>(true);
same<ReturnType<typeof sheetJsonSchema>, Record<string, unknown>>(true);

const written = writeLimits(seat, { form: "limits", unit: "in", numbers: "inch", places: 4 });
same<typeof written.text, string>(true);

// a bare number is no length
// @ts-expect-error
isoLimits(40, "m6");
// @ts-expect-error
fitOf(40, 40);
// @ts-expect-error
limits({ nominal: 40, upper: 0, lower: 0 });
// nor is what is no unit
// @ts-expect-error
seat.max.to("mil");
// results are not changed
// @ts-expect-error
seat.max = um(1);
// @ts-expect-error
seat.max.ticks = 1;
// @ts-expect-error
seat.basis.push({ standard: "", place: "", says: "", how: "caller" });

export { digits };
