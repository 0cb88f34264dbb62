import { ownValue } from "../ownValue.js";
import type { Basis, Caution } from "../basis.js";

/** A value here was not read in any print of the standard. */
export const FROM_MEMORY: Caution = Object.freeze({
  code: "GENERAL_VALUE_FROM_MEMORY",
  says: "A value or rule here is remembered, see the basis: check it against the standard before acceptance.",
});

/** ISO 2768-1, from memory: what a part outside a general tolerance means. */
export const NOT_A_REJECT: Caution = Object.freeze({
  code: "GENERAL_NOT_A_REJECT",
  says:
    "A part outside a general tolerance of ISO 2768 is not rejected for that alone while its function is not impaired, " +
    "unless the drawing says otherwise: call it outside the general tolerance.",
});

/** The indication ends in -E. */
export const ENVELOPE: Caution = Object.freeze({
  code: "GENERAL_ENVELOPE_REQUIRED",
  says: "-E: the envelope requirement applies to single features of size, beyond these limits.",
});

/** Part 2 is called without its date. */
export const PART_2_WITHDRAWN: Caution = Object.freeze({
  code: "GENERAL_PART_2_WITHDRAWN",
  says:
    "ISO 2768-2:1989 was withdrawn in 2021 for ISO 22081:2021, which has no tables: a drawing that keeps these values " +
    "has to call ISO 2768-2:1989 by its date, and this one does not.",
});

/** Part 2 is called by its date. */
export const PART_2_BY_DATE: Caution = Object.freeze({
  code: "GENERAL_PART_2_WITHDRAWN",
  says: "ISO 2768-2:1989 was withdrawn in 2021; the drawing calls it by its date, so its values stay.",
});

/** A casting grade is called without an edition. */
export const CASTING_EDITION: Caution = Object.freeze({
  code: "GENERAL_EDITION_NOT_READ",
  says: "The figures are those of ISO 8062-3:2007. The indication has no edition, and the table of 2023 was not read.",
});

/** The line comes from a preset or a saying, not from the drawing. */
export const COMMON_PRACTICE: Caution = Object.freeze({
  code: "TITLE_BLOCK_COMMON_PRACTICE",
  says: "This is common practice and no standard: the block of the drawing itself governs.",
});

/** The cautions, with one more where a step of the basis is from memory. */
export function cautionsFor(basis: Basis, cautions: readonly Caution[]): readonly Caution[] {
  return Object.freeze(
    basis.some((step) => ownValue(step, "mark") === "memory") ? [...cautions, FROM_MEMORY] : [...cautions],
  );
}

/** The cautions of a line: none for the drawing's own, for one of a preset that it is common practice. */
export function lineCautions(basis: Basis): readonly Caution[] {
  return cautionsFor(basis, basis.some(({ how }) => how === "common practice") ? [COMMON_PRACTICE] : []);
}
