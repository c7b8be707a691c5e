import { mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { endProcess } from "../machine/endProcess.mjs";
import { isAlive, processMark } from "../machine/processMark.mjs";

/** Every running `npm start` leaves a note of itself and its web server. @typedef {{ launcher: string, web: string | null, port: number | null }} LauncherNote */

/** @param {string} data */
const notesIn = (data) => join(data, "launchers");

/** @param {string} data @returns {{ file: string, note: LauncherNote | null }[]} */
function readNotes(data) {
  mkdirSync(notesIn(data), { recursive: true });
  return readdirSync(notesIn(data)).map((name) => {
    const file = join(notesIn(data), name);
    try {
      return { file, note: JSON.parse(readFileSync(file, "utf8")) };
    } catch {
      return { file, note: null };
    }
  });
}

/** @param {string} data @param {{ web: string | null, port: number | null }} what */
export function writeNote(data, { web, port }) {
  mkdirSync(notesIn(data), { recursive: true });
  writeFileSync(join(notesIn(data), `${process.pid}.json`), JSON.stringify({ launcher: processMark(process.pid), web, port }));
}

/** @param {string} data */
export function removeNote(data) {
  rmSync(join(notesIn(data), `${process.pid}.json`), { force: true });
}

/** Ends the web servers of launchers that were killed; tells how many. @param {string} data */
export async function clearDeadLaunchers(data) {
  let orphans = 0;
  for (const { file, note } of readNotes(data)) {
    if (note && isAlive(note.launcher)) continue;
    if (note?.web && isAlive(note.web)) {
      orphans += 1;
      await endProcess(note.web);
    }
    rmSync(file, { force: true });
  }
  return orphans;
}

/** Other launchers at work on this folder. @param {string} data @returns {LauncherNote[]} */
export function otherLaunchers(data) {
  const self = processMark(process.pid);
  return readNotes(data).flatMap(({ note }) => (note && note.launcher !== self && isAlive(note.launcher) ? [note] : []));
}
