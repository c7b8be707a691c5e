import { spawnSync } from "node:child_process";
import { PlainError } from "../plainError.mjs";
import { say } from "../say.mjs";
import { run } from "./run.mjs";

const NO_MAIN_CLUSTER =
  "mkdir -p /etc/postgresql-common && { test -e /etc/postgresql-common/createcluster.conf || echo 'create_main_cluster = false' > /etc/postgresql-common/createcluster.conf; }";

/** What to run as root to install a package; Debian's own database cluster is not wanted beside ours. @param {string} name */
export const installCommands = (name) => [
  ...(name === "postgresql" ? [NO_MAIN_CLUSTER] : []),
  "apt-get update -q",
  `DEBIAN_FRONTEND=noninteractive apt-get install -y -q --no-install-recommends ${name}`,
];

/** How to become root: not at all, through sudo (silently, or asking at a terminal), or null when there is no way. */
function wayToRoot() {
  if (process.getuid?.() === 0) return [];
  if (spawnSync("sudo", ["-n", "true"], { stdio: "ignore" }).status === 0) return ["sudo", "-n"];
  const hasSudo = spawnSync("sudo", ["-V"], { stdio: "ignore" }).status === 0;
  return hasSudo && process.stdin.isTTY ? ["sudo"] : null;
}

/**
 * Installs a package of Debian, or says exactly what somebody must run.
 * @param {string} name
 * @param {string} purpose
 */
export async function installDebianPackage(name, purpose) {
  const commands = installCommands(name);
  const advice = `To install it by hand, run as root:\n\n${commands.map((command) => `    ${command}`).join("\n")}\n`;
  if (spawnSync("apt-get", ["--version"], { stdio: "ignore" }).status !== 0) {
    throw new PlainError(`${purpose} needs the program package \`${name}\`, and this system has no apt-get to install it with. Install it your system's way and try again.`);
  }
  const way = wayToRoot();
  if (way === null) throw new PlainError(`${purpose} needs Debian's package \`${name}\`, which is not installed, and this user may not install it. ${advice}`);
  say(`${purpose} needs Debian's package ${name}: installing it ...`);
  for (const command of commands) {
    const [program = "sh", ...parameters] = [...way, "sh", "-c", command];
    const { code } = await run(program, parameters, { cwd: "/", asks: true });
    if (code !== 0 && !command.startsWith("apt-get update")) throw new PlainError(`Installing ${name} failed. ${advice}`);
  }
}
