// Short names for functions: this library's own list; each leads to a name of the table of functions.

/** Short name, name in the table. */
export const FUNCTION_ALIASES: ReadonlyMap<string, string> = new Map([
  ["bearing seat", "rolling bearing fit, shaft and housing"],
  ["rolling bearing seat", "rolling bearing fit, shaft and housing"],
  ["journal bearing", "bronze journal bearings"],
  ["press fit", "press-fit parts"],
  ["seal lip", "radial lip seal counterface"],
  ["lip seal", "radial lip seal counterface"],
  ["keyway side", "keyway sides"],
  ["keyseat side", "keyway sides"],
  ["keyseat sides", "keyway sides"],
  ["keyseat bottom", "keyway bottom"],
  ["o-ring groove", "O-ring groove, static"],
  ["clearance surface", "clearance surfaces"],
  ["spline shaft", "spline shafts"],
  ["gear tooth", "gear teeth"],
  ["slideway", "slideways and gibs"],
  ["gasket face", "surfaces for soft gaskets"],
  ["thread", "chased and cut threads"],
]);
