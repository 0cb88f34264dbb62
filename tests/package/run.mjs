import { spawn } from "node:child_process";

/** Runs a program to its end and gives what it printed; fails with that text unless it ends well. */
export function run(command, parameters, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, parameters, { ...options, env: childEnvironment(), shell: needsShell(command) });
    let printed = "";
    let errors = "";
    child.stdout.on("data", (data) => (printed += data));
    child.stderr.on("data", (data) => (errors += data));
    child.on("error", reject);
    child.on("close", (code) => {
      if (code === 0) resolve(printed);
      else reject(new Error(`${command} ${parameters.join(" ")}: exit code ${code}\n${printed}${errors}`.trimEnd()));
    });
  });
}

/** Without what `npm run` says about this repo, so that npm takes a folder elsewhere for what it is. */
function childEnvironment() {
  const own = /^npm_(?:config_(?:local_prefix|prefix)|package_|lifecycle_|command$|execpath$)|^INIT_CWD$/;
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !own.test(name)));
}

/** npm is a script file on Windows. */
function needsShell(command) {
  return process.platform === "win32" && command === "npm";
}
