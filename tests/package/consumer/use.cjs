const entries = require("./entries.json");
const { exercise } = require("./exercise.cjs");

for (const entry of entries) require(entry);
exercise(require);
