// A small runner: checks go on after one has failed, so that one run shows everything that is wrong.

/** Runs named checks one after another and prints a line for each; gives how many passed and failed. */
export async function runChecks(checks) {
  let passed = 0;
  let failed = 0;
  for (const [name, check] of checks) {
    try {
      const note = await check();
      passed++;
      console.log(`  ✓ ${name}${note === undefined ? "" : `  ${note}`}`);
    } catch (error) {
      failed++;
      console.log(`  ✗ ${name}\n${indent(error instanceof Error ? error.message : String(error))}`);
    }
  }
  return { passed, failed };
}

function indent(text) {
  return text.replace(/^/gm, "      ");
}
