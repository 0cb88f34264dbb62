/** Words behind a number that make it a count: `4 PLACES`. */
export const PLACES: readonly string[] = ["PLACES", "PLACE", "PLCS", "PLS", "PL"];
