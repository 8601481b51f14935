// Where the machine's Chromium is. Used by the pre script and by the browser tests.
import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];

function isExecutable(path) {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch (error) {
    if (['ENOENT', 'EACCES', 'ENOTDIR'].includes(error.code)) return false;
    throw error;
  }
}

/** The path of a program on PATH, or null. */
export function findProgram(name) {
  const folders = (process.env.PATH ?? '').split(delimiter).filter(Boolean);
  return folders.map((folder) => join(folder, name)).find(isExecutable) ?? null;
}

/** The path of a Chromium: CHROMIUM_PATH when set, else the first known name on PATH, else null. */
export function findBrowser() {
  const asked = process.env.CHROMIUM_PATH;
  if (asked) return isExecutable(asked) ? asked : null;
  return NAMES.map(findProgram).find((path) => path !== null) ?? null;
}
