/** Classes of ISO 2768-1 for sizes and angles: fine, medium, coarse, very coarse. */
export type Iso2768Linear = "f" | "m" | "c" | "v";

/** Classes of ISO 2768-2:1989 for geometry, finest first. */
export type Iso2768Geometry = "H" | "K" | "L";

/** Grades of ISO 8062-3 for castings, finest first. */
export type CastingGrade = 1 | 2 | 3 | 4 | 5 | 6 | 7 | 8 | 9 | 10 | 11 | 12 | 13 | 14 | 15 | 16;

/** Classes of ISO 13920 for sizes and angles of welded constructions, finest first. */
export type Iso13920Linear = "A" | "B" | "C" | "D";

/** Classes of ISO 13920 for straightness, flatness and parallelism, finest first. */
export type Iso13920Form = "E" | "F" | "G" | "H";

/** What an indication such as `ISO 2768-mK` calls. */
export interface Iso2768Indication {
  /** Tells the three standards apart. */
  readonly standard: "ISO 2768";
  /** The indication as it was written. */
  readonly text: string;
  /** Class of part 1, for sizes and angles; `null` where only part 2 is called. */
  readonly linear: Iso2768Linear | null;
  /** Class of part 2, for geometry; `null` where only part 1 is called. */
  readonly geometry: Iso2768Geometry | null;
  /** True where part 2 is called by its date, as a drawing made after its withdrawal has to. */
  readonly geometryDated: boolean;
  /** True with `-E`: the envelope requirement applies to all single features of size. */
  readonly envelope: boolean;
}

/** What an indication such as `ISO 8062-3 - DCTG 8` calls. */
export interface CastingIndication {
  /** Tells the three standards apart. */
  readonly standard: "ISO 8062-3";
  /** The indication as it was written. */
  readonly text: string;
  /** The grade that is called. */
  readonly grade: CastingGrade;
  /** `"CT"` in ISO 8062:1994, with the same figures. */
  readonly series: "DCTG" | "CT";
  /** True where an edition was written that holds these figures. */
  readonly dated: boolean;
}

/** What an indication such as `ISO 13920-BF` calls. */
export interface WeldmentIndication {
  /** Tells the three standards apart. */
  readonly standard: "ISO 13920";
  /** The indication as it was written. */
  readonly text: string;
  /** Class for sizes and angles. */
  readonly linear: Iso13920Linear;
  /** Class for straightness, flatness and parallelism; `null` where it is not called. */
  readonly form: Iso13920Form | null;
  /** Edition, where it was written; it matters at exactly 2 mm only. */
  readonly edition: "1996" | "2023" | null;
}

/** A general tolerance by standard, told apart by `standard`: plain frozen data. */
export type GeneralTolerance = Iso2768Indication | CastingIndication | WeldmentIndication;

/** What functions take for it: the indication as text, or one that was read before. */
export type GeneralToleranceLike = string | { readonly text: string };
