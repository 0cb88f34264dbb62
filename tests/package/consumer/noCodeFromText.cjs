// Loaded before everything else: counts each attempt to make code from a text, and refuses it. The count matters:
// a library that tries and catches the refusal still sets off the alarm of a page with a strict policy.

const kinds = [function () {}, async function () {}, function* () {}, async function* () {}];
let attempts = 0;

function refuse() {
  attempts++;
  throw new EvalError("code made from text");
}

for (const kind of kinds) {
  const prototype = Object.getPrototypeOf(kind);
  const stub = function () {
    refuse();
  };
  Object.defineProperty(stub, "prototype", { value: prototype });
  Object.defineProperty(prototype, "constructor", { value: stub });
  if (kind === kinds[0]) globalThis.Function = stub;
}
globalThis.eval = refuse;

process.on("exit", () => {
  if (attempts === 0) return;
  console.error(`${attempts} times code was made from text`);
  process.exitCode = 1;
});
