import { attempt, readCallout, writeCallout } from "limitsmith";
import type {
  CalloutOptions,
  CalloutRequest,
  CalloutStyle,
  DecimalMark,
  LengthUnit,
  WrittenDimension,
} from "limitsmith";
import { describe, expect, it } from "vitest";
import { thrown } from "../support/thrown.js";
import { readCases } from "./readCases.js";

// What a drafter means by a callout, typed by hand: the reader must give the whole request and nothing else.

interface Input {
  readonly text: string;
  readonly unit?: LengthUnit;
  readonly decimalMark?: DecimalMark;
  /** The text goes on with this piece, so many times. */
  readonly repeat?: readonly [string, number];
}
interface Refused {
  readonly input: Input;
  readonly code: string;
  /** Where the code alone would not say enough. */
  readonly position?: readonly [number, number];
}

type Compact = Readonly<Record<string, unknown>>;

const corpus = readCases<Input, Compact>("callouts/corpus.json");
const { refused } = corpus as typeof corpus & { readonly refused: readonly Refused[] };

function textOf({ text, repeat }: Input): string {
  return repeat === undefined ? text : text + repeat[0].repeat(repeat[1]);
}

function optionsOf({ unit, decimalMark }: Input): CalloutOptions {
  return { ...(unit === undefined ? {} : { unit }), ...(decimalMark === undefined ? {} : { decimalMark }) };
}

/** Name of a test: what was written, lines and marks visible. */
function named(input: Input): string {
  const text = textOf(input);
  const shown = JSON.stringify(text.length > 60 ? `${text.slice(0, 20)}… ${text.length} characters` : text);
  return `${shown} ${input.unit ?? "no unit"}${input.decimalMark === undefined ? "" : " ,"}`;
}

function sizeOf({ text, form, places, length, unitWritten }: WrittenDimension): readonly unknown[] {
  // a fraction has no decimals: any other count shows
  const decimals = form === "fraction" && places === 0 ? "fraction" : places;
  return [text, decimals, length.toString(), ...(unitWritten ? ["unit written"] : [])];
}

function pairOf({ max, min }: { readonly max: WrittenDimension; readonly min: WrittenDimension }): readonly unknown[] {
  return JSON.stringify(max) === JSON.stringify(min) ? [sizeOf(max)] : [sizeOf(max), sizeOf(min)];
}

/** The request in the short form of the corpus: what stands for nothing is left out. */
function compact(request: CalloutRequest): Compact {
  return {
    kind: request.kind,
    ...(request.shape === "unmarked" ? {} : { shape: request.shape }),
    ...(request.count === null ? {} : { count: request.count }),
    ...(request.typical ? { typical: true } : {}),
    ...(request.through ? { through: true } : {}),
    ...(request.depth === null ? {} : { depth: sizeOf(request.depth) }),
    ...(request.dual === null ? {} : { dual: pairOf(request.dual) }),
    ...byKind(request),
  };
}

function byKind(request: CalloutRequest): Compact {
  switch (request.kind) {
    case "class":
      return {
        nominal: sizeOf(request.nominal),
        class: request.toleranceClass,
        ...(request.printed === null ? {} : { printed: pairOf(request.printed) }),
      };
    case "fit":
      return { nominal: sizeOf(request.nominal), fit: request.fit };
    case "inch class":
      return {
        nominal: sizeOf(request.nominal),
        class: request.inchClass,
        ...(request.member === null ? {} : { member: request.member }),
      };
    case "deviations":
      return {
        nominal: sizeOf(request.nominal),
        upper: request.upper.toString(),
        lower: request.lower.toString(),
        form: request.form,
      };
    case "limits":
      return { max: sizeOf(request.max), min: sizeOf(request.min) };
    case "single limit":
      return { size: sizeOf(request.size), side: request.side };
    case "chamfer":
      return { length: sizeOf(request.length), angle: request.angle.toString(), ...own(request.deviations) };
    case "angle":
      return { angle: request.angle.toString(), ...own(request.deviations) };
    case "thread":
      return { designation: request.designation };
    case "plain":
    case "reference":
    case "basic":
      return { nominal: sizeOf(request.nominal) };
  }
}

function own(
  deviations: { readonly upper: { toString(): string }; readonly lower: { toString(): string } } | null,
): Compact {
  return deviations === null ? {} : { upper: deviations.upper.toString(), lower: deviations.lower.toString() };
}

/** The sizes whose own text must lie inside a part of the callout. */
function placed(request: CalloutRequest): readonly (readonly [string, string])[] {
  const sizes = ((): readonly WrittenDimension[] => {
    switch (request.kind) {
      case "limits":
        return [request.max, request.min];
      case "single limit":
        return [request.size];
      case "chamfer":
        return [request.length];
      case "angle":
      case "thread":
        return [];
      default:
        return [request.nominal];
    }
  })();
  return [
    ...sizes.map((size) => ["size", size.text] as const),
    ...(request.depth === null ? [] : [["depth", request.depth.text] as const]),
    ...(request.dual === null ? [] : [["other unit", request.dual.max.text] as const]),
    ...(request.kind === "class" ? [["class", request.toleranceClass] as const] : []),
    ...(request.kind === "inch class" && request.member !== null ? [["member", ""] as const] : []),
    ...(request.kind === "deviations" ? [["tolerance", ""] as const] : []),
    ...(request.kind === "thread" ? [["thread", request.designation] as const] : []),
    ...(request.kind === "angle" || request.kind === "chamfer" ? [["angle", ""] as const] : []),
    ...(request.shape === "unmarked" ? [] : [["shape", ""] as const]),
    ...(request.count === null ? [] : [["count", String(request.count)] as const]),
  ];
}

describe("callouts as drafters write them", () => {
  it("is a corpus of more than 250, with more than 80 to refuse, none of them twice", () => {
    const inputs = [...corpus.cases, ...refused].map(({ input }) => JSON.stringify([textOf(input), optionsOf(input)]));
    expect(corpus.cases.length).toBeGreaterThan(500);
    expect(refused.length).toBeGreaterThan(150);
    expect(new Set(inputs).size).toBe(inputs.length);
  });

  it.each(corpus.cases.map((one) => [named(one.input), one] as const))("%s", (_name, { input, expected }) => {
    const request = readCallout(textOf(input), optionsOf(input));
    expect(compact(request)).toEqual(expected);
    expect(request.text).toBe(textOf(input));
  });

  it("says where each part stood", () => {
    let read = 0;
    for (const { input } of corpus.cases) {
      const text = textOf(input);
      const answer = attempt(() => readCallout(text, optionsOf(input)));
      if (!answer.ok) continue; // has failed above, by its name
      read++;
      const { parts } = answer.value;
      let before = 0;
      for (const { start, end } of parts) {
        expect(start, text).toBeGreaterThanOrEqual(before);
        expect(end, text).toBeGreaterThan(start);
        before = end;
      }
      expect(before, text).toBeLessThanOrEqual(text.length);
      for (const [name, piece] of placed(answer.value)) {
        const where = parts.filter(({ part }) => part === name).map(({ start, end }) => text.slice(start, end));
        // a chamfer written C0.5 has no angle in its text
        if (name === "angle" && /^(?:\d+X )?C/.test(text)) continue;
        expect(
          where.some((slice) => slice.includes(piece)),
          `${name} of ${text}: ${where.join(" | ")}`,
        ).toBe(true);
      }
    }
    expect(read).toBeGreaterThan(400);
  });

  it("reading back what was written gives the same request", () => {
    const styles: readonly CalloutStyle[] = [
      { numbers: "inch" },
      { numbers: "metric" },
      { numbers: "metric", decimalMark: "," },
    ];
    const different: string[] = [];
    for (const { input } of corpus.cases) {
      const answer = attempt(() => readCallout(textOf(input), optionsOf(input)));
      if (!answer.ok) continue; // has failed above, by its name
      for (const style of styles) {
        const written = writeCallout(answer.value, style);
        const again = attempt(() =>
          readCallout(written, { ...optionsOf(input), decimalMark: style.decimalMark ?? "." }),
        );
        if (!again.ok) different.push(`${named(input)} → ${written}: ${again.error.code}`);
        else if (meaning(again.value) !== meaning(answer.value)) different.push(`${named(input)} → ${written}`);
      }
    }
    expect(different).toEqual([]);
  });
});

/** The request without its number texts, whose marks and zeros belong to the style. */
function meaning(request: CalloutRequest): string {
  return JSON.stringify(request, (key, value: unknown) => (key === "text" || key === "parts" ? undefined : value));
}

describe("callouts to refuse", () => {
  it.each(refused.map((one) => [named(one.input), one] as const))("%s", (_name, { input, code, position }) => {
    const error = thrown(() => readCallout(textOf(input), optionsOf(input)));
    expect(error.code).toBe(code);
    if (position !== undefined) expect(error.position).toEqual({ start: position[0], end: position[1] });
  });

  it("what is not understood has a place in the text, and a hint", () => {
    const wanting = refused.flatMap(({ input, code }) => {
      const text = textOf(input);
      const answer = attempt(() => readCallout(text, optionsOf(input)));
      if (code !== "CALLOUT_NOT_UNDERSTOOD" || answer.ok) return []; // an answer has failed above
      const { position, allowed } = answer.error;
      const inside = position !== null && position.start <= position.end && position.end <= text.length;
      return inside && allowed !== null ? [] : [text];
    });
    expect(wanting).toEqual([]);
  });
});
