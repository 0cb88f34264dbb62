// Which line of each chart a trade name reads: this library's own list, no published table. A name that is itself a
// line of a chart and stands here with nothing else needs no entry: see processes.ts.

/** A trade name and the lines that speak of it. */
export interface ProcessName {
  readonly name: string;
  readonly also: readonly string[];
  /** Line of the roughness chart (ASME B46.1). */
  readonly roughness: string | null;
  /** Bars of the grade chart of ANSI B4.1. */
  readonly ansi: readonly string[];
  /** Entries of the ISO grade chart. */
  readonly iso: readonly string[];
  /** Lines of the table of tolerances in mm. */
  readonly tolerance: readonly string[];
}

/** Trade names in the order of the roughness chart, then those that only a grade chart has. */
export const PROCESS_NAMES: readonly ProcessName[] = [
  entry("flame cutting", ["oxy-fuel cutting", "oxy-fuel gas cutting"], "flame cutting", [], ["flame cutting"], ["oxy-fuel gas cutting"]),
  entry("snagging", [], "snagging", [], [], []),
  entry("sawing", [], "sawing", [], [], ["band sawing", "circular sawing"]),
  entry("planing, shaping", ["planing and shaping"], "planing, shaping", ["planing and shaping"], ["planing"], ["planing, shaping"]),
  entry("planing", [], "planing, shaping", ["planing and shaping"], ["planing"], ["planing, shaping"]),
  entry("shaping", [], "planing, shaping", ["planing and shaping"], [], ["planing, shaping"]),
  entry("drilling", [], "drilling", ["drilling"], ["drilling"], ["drilling"]),
  entry("chemical milling", ["chemical machining"], "chemical milling", [], [], ["chemical machining"]),
  entry("electro-discharge machining", ["electrical discharge machining", "EDM", "spark erosion"], "electro-discharge machining", [], [], ["electro-discharge machining"]),
  entry("milling", [], "milling", ["milling"], ["milling"], ["milling"]),
  entry("broaching", [], "broaching", ["broaching"], ["broaching"], ["broaching"]),
  entry("reaming", [], "reaming", ["reaming"], ["reaming"], ["reaming"]),
  entry("electron beam", ["electron beam machining"], "electron beam", [], [], ["electron beam machining"]),
  entry("laser", ["laser beam machining", "laser cutting"], "laser", [], [], ["laser beam machining"]),
  entry("electrochemical", ["electrochemical machining", "ECM"], "electrochemical", [], [], ["electrochemical machining"]),
  entry(
    "boring, turning",
    ["turning, boring", "boring and turning", "turning and boring"],
    "boring, turning",
    ["turning", "boring"],
    ["rough turning", "rough boring", "horizontal boring machine", "vertical boring machine", "centre lathe turning", "centre lathe boring", "high-quality turning", "fine boring"],
    ["turning, boring"],
  ),
  entry("turning", [], "boring, turning", ["turning"], ["rough turning", "centre lathe turning", "high-quality turning"], ["turning, boring"]),
  entry(
    "boring",
    [],
    "boring, turning",
    ["boring"],
    ["rough boring", "horizontal boring machine", "vertical boring machine", "centre lathe boring", "fine boring"],
    ["turning, boring"],
  ),
  entry("rough turning", [], "boring, turning", ["turning"], ["rough turning"], ["turning, boring"]),
  entry("high-quality turning", ["fine turning", "finish turning"], "boring, turning", ["turning"], ["high-quality turning"], ["turning, boring"]),
  entry("rough boring", [], "boring, turning", ["boring"], ["rough boring"], ["turning, boring"]),
  entry("fine boring", ["finish boring"], "boring, turning", ["boring"], ["fine boring"], ["turning, boring"]),
  entry("barrel finishing", ["tumbling"], "barrel finishing", [], [], []),
  entry("electrolytic grinding", [], "electrolytic grinding", [], [], []),
  entry("roller burnishing", ["burnishing"], "roller burnishing", [], [], []),
  entry("grinding", [], "grinding", ["cylindrical grinding", "surface grinding"], ["grinding", "fine grinding"], ["abrasive grinding, polishing"]),
  entry("cylindrical grinding", [], "grinding", ["cylindrical grinding"], ["grinding", "fine grinding"], ["abrasive grinding, polishing"]),
  entry("surface grinding", [], "grinding", ["surface grinding"], ["grinding", "fine grinding"], ["abrasive grinding, polishing"]),
  entry("fine grinding", [], "grinding", ["cylindrical grinding", "surface grinding"], ["fine grinding"], ["abrasive grinding, polishing"]),
  entry("honing", [], "honing", ["lapping and honing"], ["honing", "fine honing"], ["honing"]),
  entry("fine honing", [], "honing", ["lapping and honing"], ["fine honing"], ["honing"]),
  entry("electro-polish", ["electropolishing", "electro-polishing"], "electro-polish", [], [], []),
  entry("polishing", [], "polishing", [], [], ["abrasive grinding, polishing"]),
  entry("lapping", [], "lapping", ["lapping and honing"], ["machine lapping", "lapping (gauges, fits of extreme precision)"], ["lapping"]),
  entry("machine lapping", [], "lapping", ["lapping and honing"], ["machine lapping"], ["lapping"]),
  entry("superfinishing", ["superfinish"], "superfinishing", [], [], []),
  entry("sand casting", [], "sand casting", [], ["sand casting (approximately)"], []),
  entry("hot rolling", [], "hot rolling", [], [], []),
  entry("forging", [], "forging", [], [], []),
  entry("permanent mould casting", ["permanent mold casting"], "permanent mould casting", [], [], []),
  entry("investment casting", [], "investment casting", [], [], []),
  entry("extruding", ["extrusion"], "extruding", [], ["extrusion"], []),
  entry("cold rolling, drawing", ["cold drawing", "cold rolling"], "cold rolling, drawing", [], [], []),
  entry("die casting", ["die casting or moulding"], "die casting", [], ["die casting or moulding"], []),
  entry("stamping", [], null, [], ["stamping (approximately)"], []),
  entry("moulding", ["molding"], null, [], ["die casting or moulding"], []),
  entry("diamond turning", [], null, ["diamond turning"], [], []),
  entry("diamond boring", [], null, ["diamond boring"], ["diamond boring"], []),
  entry("lapping and honing", [], null, ["lapping and honing"], ["honing", "fine honing", "machine lapping", "lapping (gauges, fits of extreme precision)"], []),
  entry("wire electro-discharge cutting", ["wire EDM"], null, [], [], ["electro-discharge wire cutting"]),
];

function entry(
  name: string,
  also: readonly string[],
  roughness: string | null,
  ansi: readonly string[],
  iso: readonly string[],
  tolerance: readonly string[],
): ProcessName {
  return { name, also, roughness, ansi, iso, tolerance };
}
