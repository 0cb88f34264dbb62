// Uses every entry of the installed package once; the expected numbers are published ones.

const assert = require("node:assert/strict");

/** Takes the loaded entries by name and fails if one of them does not do its work. */
exports.exercise = (room) => {
  const root = room("limitsmith");
  const { mm, inch } = room("limitsmith/units");
  const { fitOf, limits } = room("limitsmith/limits");
  const { isoDeviations, isoFit, isoLimits } = room("limitsmith/iso286");
  const { LimitsError, attempt } = room("limitsmith/errors");
  const { resolveCallout } = room("limitsmith/callout");
  const { defaultLimits, titleBlock } = room("limitsmith/titleBlock");
  const { resolveSheet, sheetSchema } = room("limitsmith/sheet");
  const { sheetJsonSchema } = room("limitsmith/schemas");

  // ISO 286-2:2010, 25 k5: +11/+2 µm
  const seat = isoLimits(mm(25), "k5");
  assert.equal(seat.max.toString(), "25.011 mm");
  assert.equal(seat.min.toString(), "25.002 mm");
  // ISO 286-2:2010, over 30 up to 50 mm, k6: +18/+2 µm
  assert.deepEqual({ ...isoDeviations(inch("1 1/4"), "k6") }, { upperDeviationUm: 18, lowerDeviationUm: 2 });

  // one copy of each room, whichever way it is loaded
  assert.equal(root.isoLimits, isoLimits);
  assert.equal(root.mm, mm);
  assert.equal(root.LimitsError, LimitsError);
  assert.equal(root.toDecimal(mm("25.4"), "in").toString(), "1");

  // what comes back from a clone is accepted
  const clone = structuredClone(isoFit(mm(25), "H7/k6"));
  assert.equal(fitOf(clone.hole, clone.shaft).kind, "transition");
  assert.throws(() => limits({ nominal: "1 mil", upper: "0 mm", lower: "0 mm" }), LimitsError);
  assert.equal(attempt(() => isoLimits(mm(25), "k99")).ok, false);

  const block = titleBlock({ unit: "in", decimals: { 3: "±.005" } });
  assert.equal(defaultLimits(block, "2.188").limits.min.toString(), "2.183 in");
  assert.equal(resolveCallout("⌀25 k5", { unit: "mm" }).limits.max.toString(), "25.011 mm");

  const drawing = {
    drawing: "Shaft",
    unit: "mm",
    features: [
      { id: "A", callout: "⌀25 k5" },
      { id: "B", callout: "?" },
    ],
  };
  const { counts } = resolveSheet(drawing);
  assert.deepEqual([counts.features, counts.limits, counts.failed], [2, 1, 1]);
  assert.equal(sheetSchema().safeParse(drawing).success, true);
  assert.equal(sheetSchema().safeParse({}).success, false);
  assert.equal(sheetJsonSchema().type, "object");
};
