import type { Basis, BasisStep, Caution } from "../basis.js";
import type { Length } from "../units/index.js";
import { CARRIES_LOAD } from "./keyCautions.js";
import type { KeyEnds, PressureForm } from "./keyLoadValue.js";
import { keyStep } from "./keyStep.js";

const FORM_SOURCES: Readonly<Record<PressureForm, Parameters<typeof keyStep>>> = {
  "half height": [
    "Machine Elements in Mechanical Design, 4th edition",
    "p. 500",
    "p = 4T / (D h l), on half the height of the key",
    "common practice",
    "two-sources",
  ],
  "h - t1": [
    "DIN 6892 method C (simple form)",
    "pressure on the hub flank",
    "p = 2T / (D l (h - t1)); chamfers and radii neglected",
    "common practice",
    "memory",
  ],
  "0.45 h": ["Roloff/Matek Maschinenelemente", "bearing height", "p = 2T / (D l 0.45 h)", "common practice", "memory"],
  "t1 or t2": [
    "Dasar Perencanaan dan Pemilihan Elemen Mesin",
    "pressure on the side of the keyway",
    "p = F / (l t), t the smaller of t1 and t2",
    "common practice",
    "one-source",
  ],
};

/** Where the formulas of a load come from. */
export function loadBasis(
  form: PressureForm,
  ends: KeyEnds,
  countsAs: number,
  allowed: BasisStep | null,
  factor: number | null,
): Basis {
  const steps = [
    keyStep(
      "Machine Elements in Mechanical Design, 4th edition",
      "p. 499",
      "F = 2T/D, shear stress = 2T / (D b l)",
      "common practice",
      "two-sources",
    ),
    keyStep(...FORM_SOURCES[form]),
  ];
  if (ends !== "square") {
    const says =
      ends === "round" ? "l = length - b: round ends do not bear" : "l = length - b/2: a round end does not bear";
    steps.push(keyStep("published machine-design texts", "bearing length", says, "common practice", "one-source"));
  }
  if (countsAs !== 1) {
    const says = "two keys 180 degrees apart count as 1.5 keys";
    steps.push(keyStep("published machine-design texts", "several keys", says, "common practice", "one-source"));
  }
  if (allowed !== null) steps.push(allowed);
  if (factor !== null) {
    steps.push(
      keyStep(
        "Machinery's Handbook, 31st edition",
        "p. 301 (University of Illinois Bulletin 42)",
        "e = 1 - 0.2 w/d - 1.1 h/d: static torsion of the shaft, no fatigue factor",
        "common practice",
        "memory",
      ),
    );
  }
  return Object.freeze(steps);
}

const LONG: Caution = Object.freeze({
  code: "KEY_LENGTH_LONG",
  says: "The key bears over more than 1.5 times the shaft diameter: textbooks (German ones from 1.3 on) do not count the rest.",
});

/** The cautions of a load: there is always one. */
export function loadCautions(bearingLength: Length | null, shaft: Length): readonly Caution[] {
  const isLong = bearingLength !== null && 2 * bearingLength.ticks > 3 * shaft.ticks;
  return Object.freeze(isLong ? [CARRIES_LOAD, LONG] : [CARRIES_LOAD]);
}
