import assert from "node:assert/strict";
import { Worker, isMainThread, parentPort } from "node:worker_threads";
import { asLimits, fitOf, inch, isoFit, isoLimits, writeLimits } from "limitsmith";
import { resolveSheet } from "limitsmith/sheet";

if (isMainThread) {
  const worker = new Worker(new URL(import.meta.url));
  let answered = false;
  process.on("exit", () => assert.ok(answered, "the worker sent nothing"));
  worker.on("error", (error) => {
    throw error;
  });
  worker.once("message", ({ limits, fit, sheet }) => {
    assert.equal(JSON.stringify(asLimits(limits)), JSON.stringify(isoLimits(inch("1.25"), "k6")));
    const style = { form: "limits", places: 4 };
    assert.equal(writeLimits(limits, style).text, writeLimits(asLimits(limits), style).text);
    assert.equal(fitOf(fit.hole, fit.shaft).maxClearance.ticks, isoFit(inch("1.25"), "H7/k6").maxClearance.ticks);
    assert.equal(sheet.counts.failed, 1);
    assert.equal(sheet.rows[0].error.code, "CALLOUT_NOT_UNDERSTOOD");
    answered = true;
  });
} else {
  parentPort.postMessage({
    limits: isoLimits(inch("1.25"), "k6"),
    fit: isoFit(inch("1.25"), "H7/k6"),
    sheet: resolveSheet({ drawing: "Shaft", unit: "mm", features: [{ id: "A", callout: "nothing" }] }),
  });
}
