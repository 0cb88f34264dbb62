import { LimitsError } from "../errors.js";
import { ownValue } from "../ownValue.js";
import { asPower, torque } from "../units/index.js";
import type { PowerLike, Torque } from "../units/index.js";
import { figures } from "./figures.js";

/** Power at a speed of rotation. */
export interface PowerAtSpeed {
  /** Power, over zero. */
  readonly power: PowerLike;
  /** Revolutions per minute. */
  readonly revolutionsPerMinute: number;
}

/**
 * The torque of a power at a speed of rotation.
 *
 * @param drive - `power` over zero (W, kW or hp) and `revolutionsPerMinute` over zero
 * @returns the torque T = P / ω, in N·m for W and kW, in lbf·in for hp, right to 12 figures
 * @throws `KEY_LOAD_INVALID`, `QUANTITY_INVALID`, `UNIT_UNKNOWN`, `UNIT_MISSING`, `NUMBER_MALFORMED`,
 *   `QUANTITY_OUT_OF_RANGE`
 * @example
 * ```ts
 * import { torqueFromPower } from "limitsmith";
 *
 * torqueFromPower({ power: "3 kW", revolutionsPerMinute: 1500 }).toString(); // → "19.098593171 N·m"
 * torqueFromPower({ power: "5 hp", revolutionsPerMinute: 0 }); // throws KEY_LOAD_INVALID
 * ```
 * @reference T = 30 P / (π n); hp of 550 lbf·ft/s
 */
export function torqueFromPower(drive: PowerAtSpeed): Torque {
  const given = ownValue(drive, "power");
  const speed: unknown = ownValue(drive, "revolutionsPerMinute");
  if (given === undefined) {
    throw new LimitsError("KEY_LOAD_INVALID", "the power is missing", { allowed: 'such as "3 kW"', path: ["power"] });
  }
  const power = asPower(given, ["power"]);
  if (power.value <= 0 || typeof speed !== "number" || !(speed > 0) || !Number.isFinite(speed)) {
    throw new LimitsError("KEY_LOAD_INVALID", "power and speed are over zero", {
      value: power.value <= 0 ? power.toString() : speed,
      allowed: "a power such as 3 kW, and revolutions per minute as a number",
      path: [power.value <= 0 ? "power" : "revolutionsPerMinute"],
    });
  }
  const perRadian = 30 / (Math.PI * speed);
  if (power.unit === "hp") return torque(figures(power.to("hp") * 6600 * perRadian), "lbf-in");
  return torque(figures(power.to("W") * perRadian), "Nm");
}
