// Plain JavaScript that runs in a process of its own, before and after the world around it is spoilt.
// What it needs of the language itself is taken here, while it is still whole.
const { keys, prototype: objectPrototype } = Object;
const { hasOwnProperty } = objectPrototype;
const { apply } = Reflect;
const { isArray } = Array;
const { sort, join, push } = Array.prototype;

/** Writes any value by its own keys and own texts, with nothing that a page could have replaced. */
export function show(value) {
  if (value === null) return "null";
  if (typeof value === "number") return Object.is(value, -0) ? "-0" : `${value}`;
  if (typeof value !== "object") return `${typeof value} ${String(value)}`;
  const parts = [];
  const names = apply(sort, keys(value), []);
  for (let index = 0; index < names.length; index++) {
    apply(push, parts, [`${names[index]}: ${show(value[names[index]])}`]);
  }
  const text =
    apply(hasOwnProperty, value, ["ticks"]) || apply(hasOwnProperty, value, ["microarcseconds"]) ? `${value}` : "";
  return `${isArray(value) ? "list" : "{}"} ${text} ${Object.isFrozen(value) ? "frozen" : "open"} (${apply(join, parts, [", "])})`;
}

/** Calls to every function of the first floors, good ones and refused ones. */
export function questions(lib) {
  const { mm, um, inch, thou } = lib;
  const limits = () => lib.limits({ nominal: mm(32), upper: um(18), lower: um(2), designation: "k6" });
  const hole = () => lib.isoLimits(mm(32), "H7");
  const block = { unit: "in", decimals: { 2: "±.01", 3: "±.005" }, fractions: "±1/64", angles: "±0°30'" };
  return {
    // units
    mm: () => [mm(25), mm("40.025"), mm("-.5"), mm(24.999999999999996)],
    um: () => [um(18), um("0.8")],
    inch: () => [inch("1 1/4"), inch(".0625"), inch("5/8"), inch(1 / 3)],
    thou: () => [thou(2), thou("1.4")],
    microinch: () => lib.microinch(63),
    "decimal objects": () => mm({ toFixed: () => "2.5" }),
    comma: () => [mm("2,5", { decimalMark: "," }), lib.readLength("40,025 mm", { decimalMark: "," })],
    "no comma": () => mm("2,5"),
    "not finite": () => mm(NaN),
    "too fine": () => inch("1/3"),
    readLength: () => [lib.readLength('1 1/4"'), lib.readLength("63 µin"), lib.readLength("0.8 um")],
    "no unit": () => lib.readLength("25"),
    mil: () => lib.readLength("5 mil"),
    "strange unit": () => lib.readLength("5 constructor"),
    readDimension: () => [lib.readDimension("2.500", { unit: "in" }), lib.readDimension("12.70 mm")],
    "readDimension without a unit": () => lib.readDimension("2.500", {}),
    "readDimension alone": () => lib.readDimension("2.500"),
    writeLength: () => [
      lib.writeLength(mm("40.0250")),
      lib.writeLength(inch("1/2"), { places: 3 }),
      lib.writeLength(mm(40), { unit: "in", places: 4, symbol: false }),
      lib.writeLength(mm("0.0025"), { places: 3, rounding: "nearest-away", sign: "always", decimalMark: "," }),
      lib.writeLength(mm(1), {}),
    ],
    "not exact": () => lib.writeLength(mm(1), { unit: "in" }),
    roundLength: () => [
      lib.roundLength(mm("25.015"), { unit: "in", places: 4 }),
      lib.roundLength(mm("25.0151"), { places: 3 }),
    ],
    "roundLength without places": () => lib.roundLength(mm(1), {}),
    exactPlaces: () => [lib.exactPlaces(inch("1/64"), "in"), lib.exactPlaces(mm(40), "in")],
    toDecimal: () => [lib.toDecimal(mm(1), "in").toFixed(20), lib.toDecimal(inch("1.2516"), "mm").toString()],
    arithmetic: () => [
      lib.add(mm(1), inch(1)),
      lib.subtract(mm(1), um(1)),
      lib.multiply(mm(7), 3),
      lib.multiply(mm(1), { numerator: 1, denominator: 3 }),
    ],
    "no factor": () => lib.multiply(mm(1), {}),
    compare: () => [lib.compareLengths(mm(1), inch(1)), lib.equalLengths(inch(1), "25.4 mm")],
    asLength: () => [lib.asLength({ ticks: 5, unit: "mm" }), lib.asLength("5 mm")],
    "no length": () => lib.asLength({}),
    "no length either": () => lib.asLength([]),
    angles: () => [
      lib.readAngle("12°15'30\""),
      lib.readAngle("0.5°"),
      lib.degrees(1 / 3),
      lib.writeAngle("0.5°", { style: "dms" }),
      lib.writeAngle("0°30'"),
    ],
    "no angle": () => lib.readAngle({}),
    text: () => [`${mm("40.025")}`, JSON.stringify(inch("1/64")), mm(5).to("um")],
    // limits
    limits,
    "limits without a lower": () => lib.limits({ nominal: mm(1), upper: mm(0) }),
    "limits of nothing": () => lib.limits({}),
    "limits with a basis": () =>
      lib.limits({
        nominal: mm(1),
        upper: mm(1),
        lower: mm(0),
        basis: [{ standard: "a", place: "b", says: "c", how: "caller" }],
      }),
    "a bad basis": () => lib.limits({ nominal: mm(1), upper: mm(1), lower: mm(0), basis: [{}] }),
    symmetricLimits: () => lib.symmetricLimits(inch("2.188"), thou(5)),
    oneSidedLimits: () => [lib.oneSidedLimits(mm(32), um(-20)), lib.oneSidedLimits(mm(32), um(20))],
    limitsFromMaxMin: () => [
      lib.limitsFromMaxMin({ max: mm(2), min: mm(1) }),
      lib.limitsFromMaxMin({ max: mm(2), min: mm(1), nominal: mm(1) }),
    ],
    singleLimit: () => lib.singleLimit("max", inch(".015")),
    angleLimits: () => lib.angleLimits({ nominal: "45°", upper: "1°", lower: "-1°" }),
    "angleLimits of nothing": () => lib.angleLimits({}),
    asLimits: () => lib.asLimits({ nominal: "40 mm", upperDeviation: "25 µm", lowerDeviation: "9 µm" }),
    "no limits": () => lib.asLimits({}),
    fitOf: () => [lib.fitOf(hole(), limits()), lib.fitOf(hole(), limits(), {})],
    "other nominals": () => lib.fitOf(hole(), lib.symmetricLimits(mm(33), um(1)), {}),
    writeLimits: () => [
      lib.writeLimits(limits(), { form: "deviations" }),
      lib.writeLimits(limits(), { form: "limits", unit: "in", places: 4 }),
      lib.writeLimits(limits(), { form: "class", rounding: "nearest", places: 2 }),
      lib.writeLimits(lib.symmetricLimits(inch("2.188"), thou(5)), { form: "plus-minus" }),
      lib.writeLimits(lib.limits({ nominal: mm(5), upper: mm(1), lower: mm("-0.5") }), {
        form: "deviations",
        decimalMark: ",",
      }),
    ],
    "no form": () => lib.writeLimits(limits(), {}),
    rankFits: () =>
      lib.rankFits(
        [
          { designation: "b", minClearanceTicks: 0, maxClearanceTicks: 5, tier: 0, system: 0 },
          { designation: "a", minClearanceTicks: 0, maxClearanceTicks: 5, tier: 0, system: 0 },
        ],
        { min: mm(0), max: mm(1) },
      ),
    "no wanted clearance": () => lib.rankFits([], {}),
    // iso286
    parseToleranceClass: () => [lib.parseToleranceClass("m6"), lib.parseToleranceClass(" JS01 ")],
    "no class": () => lib.parseToleranceClass("__proto__"),
    "no class either": () => lib.parseToleranceClass({}),
    "strange letter": () => lib.parseToleranceClass("i6"),
    isoDeviations: () =>
      ["m6", "H7", "P7", "js7", "J7", "zc11", "K8", "M6"].map((cls) => lib.isoDeviations(mm(300), cls)),
    isoLimits: () => [
      lib.isoLimits(mm(40), "m6"),
      lib.isoLimits(inch("1.25"), "k6", {}),
      lib.isoLimits(mm(8), "js7", { jsRounding: "even" }),
    ],
    "isoLimits of 2010": () => [lib.isoLimits(mm(12), "cd8"), lib.isoLimits(mm(12), "cd8", {})],
    "isoLimits of 1988": () => lib.isoLimits(mm(12), "cd8", { edition: "1988" }),
    "not defined": () => lib.isoLimits(mm(20), "t6"),
    "no such size": () => lib.isoLimits(mm(0), "m6"),
    isoFit: () => [lib.isoFit(mm(35), "H7/k6"), lib.isoFit(mm(35), { hole: "K7", shaft: "h6" })],
    "no fit": () => lib.isoFit(mm(35), {}),
    "two holes": () => lib.isoFit(mm(35), "H7/K6"),
    standardTolerance: () => [lib.standardTolerance(mm(35), "IT7"), lib.standardTolerance(mm(35), "IT01")],
    "no grade": () => lib.standardTolerance(mm(35), "IT19"),
    fundamentalDeviation: () => [lib.fundamentalDeviation(mm(35), "P7"), lib.fundamentalDeviation(mm(35), "m6", {})],
    isoClassesFor: () => [
      lib.isoClassesFor(limits()),
      lib.isoClassesFor(lib.limitsFromMaxMin({ max: inch(".9848"), min: inch(".9843"), nominal: mm(25) }), {
        printed: { unit: "in", places: 4 },
        kind: "shaft",
      }),
    ],
    "isoClassesFor without places": () => lib.isoClassesFor(limits(), { printed: {} }),
    isoFitsFor: () => lib.isoFitsFor({ size: mm(35), clearance: { min: um(5), max: um(60) }, most: 3 }),
    "isoFitsFor nothing": () => lib.isoFitsFor({ size: mm(35) }),
    "preferred lists": () => [lib.preferredIsoClasses(), lib.preferredIsoFits()],
    // title block and callout
    titleBlock: () => lib.titleBlock(block),
    "a short title block": () => lib.titleBlock({ unit: "mm", decimals: { 1: "±0.1 mm" } }),
    defaultLimits: () => [lib.defaultLimits(block, "2.188"), lib.defaultLimits(block, "1 1/2")],
    "no such line": () => lib.defaultLimits({ unit: "in", decimals: { 3: "±.005" } }, "1 1/2"),
    readCallout: () =>
      ["⌀40 m6", "25H7", "(3.75)", "1.375 +.0020/-.0014"].map((text) => lib.readCallout(text, { unit: "mm" })),
    "readCallout alone": () => lib.readCallout("40 m6", {}),
    resolveCallout: () => [
      lib.resolveCallout("2.188", { titleBlock: block }),
      lib.resolveCallout("⌀35 mm k6", { feature: "shaft" }),
      lib.resolveCallout("2.188", { titleBlock: { unit: "in", decimals: { 3: "±.005" } } }),
    ],
    // errors
    attempt: () => [lib.attempt(() => lib.readLength("5 mil")), lib.attempt(() => mm(5))],
    "a plain error": () => new lib.LimitsError("TEXT_EMPTY", "nothing", {}).toJSON(),
  };
}

/** The answer to each question as text; a refusal is an answer too. */
export function answers(lib) {
  const asked = questions(lib);
  const names = keys(asked);
  const given = [];
  for (let index = 0; index < names.length; index++) {
    let text;
    try {
      text = show(asked[names[index]]());
    } catch (error) {
      text = error.name === "LimitsError" ? `refused ${show(error.toJSON())}` : `broke: ${error.name} ${error.message}`;
    }
    apply(push, given, [{ name: names[index], text }]);
  }
  return given;
}
