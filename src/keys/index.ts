export type { KeyedParts, KeyLimitsLike, KeyseatLike } from "./assemblyParts.js";
export type {
  AssemblyFinding,
  AssemblyVerdict,
  BearingVerdict,
  KeyedAssembly,
  StackRange,
  StackTerm,
  TakeUp,
  TopClearance,
} from "./assemblyValue.js";
export { keyseatCrown } from "./crown.js";
export { decodeWoodruffNumber } from "./decodeWoodruffNumber.js";
export type { InchDepthRounding } from "./inchDepth.js";
export { inchKey } from "./inchKey.js";
export type { InchKeyChoice } from "./inchKeySize.js";
export { inchKeyseat } from "./inchKeyseat.js";
export type { InchKeyseatOptions } from "./inchKeyseat.js";
export { keyedAssembly } from "./keyedAssembly.js";
export { keyLoad } from "./keyLoad.js";
export type { KeyAllowables, KeyLoadParts, KeyMaterials } from "./keyLoad.js";
export type {
  BearingAllowables,
  KeyEnds,
  KeyLoad,
  NeededLength,
  PressureForm,
  SeveralKeysRule,
  ShearRule,
  TorqueCapacity,
} from "./keyLoadValue.js";
export { keyseatControl } from "./keyseatControl.js";
export { keyseatFindings } from "./keyseatFindings.js";
export type { KeyseatFinding, PrintedKeyseat } from "./keyseatFindings.js";
export { keyseatRows } from "./keyseatRows.js";
export type {
  InchKeyseatSpec,
  KeyseatPlace,
  KeyseatRow,
  KeyseatRows,
  KeyseatSpec,
  MetricKeyseatSpec,
  MetricWoodruffKeyseatSpec,
  WoodruffKeyseatSpec,
} from "./keyseatRows.js";
export { keyseatSideDepth } from "./keyseatSideDepth.js";
export type { InchKeyClass, InchKeyseat, InchKeyseatMember, KeyseatCorners, KeyseatMember } from "./keyseatValue.js";
export type { GibHead, InchKey, InchKeyKind, KeyLimits, KeySection, KeySectionLike, KeyShape } from "./keyValue.js";
export { keywayStrengthFactor } from "./keywayStrengthFactor.js";
export type { KeyedShaft } from "./keywayStrengthFactor.js";
export type { MeasuredSeat } from "./measuredDepth.js";
export { metricKey } from "./metricKey.js";
export { metricKeyLength } from "./metricKeyLength.js";
export type { MetricKeyLength, MetricKeyLengthOptions } from "./metricKeyLength.js";
export { metricKeyseat } from "./metricKeyseat.js";
export type { KeywayClasses, MetricKeyFit, MetricKeyseatOptions } from "./metricKeyseat.js";
export type { MetricKeyChoice } from "./metricKeySize.js";
export type {
  MetricHubDepth,
  MetricKey,
  MetricKeyseat,
  MetricKeyStandard,
  MetricKeywayMember,
  SizeRange,
} from "./metricValue.js";
export type {
  DinWoodruffSeries,
  MetricWoodruffChoice,
  MetricWoodruffStandard,
  WoodruffDuty,
} from "./metricWoodruff.js";
export { metricWoodruffKey } from "./metricWoodruffKey.js";
export type { MetricWoodruffKey } from "./metricWoodruffKey.js";
export { metricWoodruffKeysFor } from "./metricWoodruffKeysFor.js";
export type { MetricWoodruffKeys, MetricWoodruffQuestion } from "./metricWoodruffKeysFor.js";
export { metricWoodruffKeyseat } from "./metricWoodruffKeyseat.js";
export type {
  MetricWoodruffKeyseat,
  MetricWoodruffKeyseatOptions,
  MetricWoodruffMember,
} from "./metricWoodruffKeyseat.js";
export { overKey } from "./overKey.js";
export type { KeyInShaft } from "./overKey.js";
export { overPin } from "./overPin.js";
export type { PinInSeat } from "./overPin.js";
export { torqueFromPower } from "./torqueFromPower.js";
export type { PowerAtSpeed } from "./torqueFromPower.js";
export { woodruffKey } from "./woodruffKey.js";
export { woodruffKeyseat } from "./woodruffKeyseat.js";
export type { WoodruffKeyseatOptions } from "./woodruffKeyseat.js";
export { woodruffKeysFor } from "./woodruffKeysFor.js";
export type { SuggestedWoodruffKeys } from "./woodruffKeysFor.js";
export { woodruffNumber } from "./woodruffNumber.js";
export type { WoodruffSize } from "./woodruffNumber.js";
export type {
  WoodruffHubSeat,
  WoodruffKey,
  WoodruffKeyseat,
  WoodruffNumber,
  WoodruffShaftSeat,
} from "./woodruffValue.js";
