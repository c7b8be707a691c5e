/**
 * Whether what npm says it installed (node_modules/.package-lock.json) is what the lock file asks for. Optional
 * packages may be missing (they are for other systems), and extraneous ones that the lock file still lists.
 * @typedef {{ packages?: Record<string, { version?: string, optional?: boolean, devOptional?: boolean, extraneous?: boolean }> }} Lock
 * @param {Lock} wanted
 * @param {Lock | null} installed
 */
export function installedMatchesLock(wanted, installed) {
  if (!installed?.packages || !wanted.packages) return false;
  for (const [path, entry] of Object.entries(wanted.packages)) {
    if (path === "") continue;
    const present = installed.packages[path];
    if (present ? present.version !== entry.version : !(entry.optional || entry.devOptional || entry.extraneous)) return false;
  }
  return true;
}
