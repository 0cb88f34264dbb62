/**
 * How a number that falls between two steps is rounded.
 *
 * - `"nearest"`: to the nearest; an exact half goes to the even last figure (ISO 80000-1:2009, B.3, rule A)
 * - `"nearest-away"`: to the nearest; an exact half goes away from zero (ISO 80000-1:2009, B.3, rule B)
 * - `"toward-zero"`: the further figures are dropped
 * - `"up"`: toward the larger value, the inside of a lower limit
 * - `"down"`: toward the smaller value, the inside of an upper limit
 */
export type Rounding = "nearest" | "nearest-away" | "toward-zero" | "up" | "down";
