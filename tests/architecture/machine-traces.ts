// Written in parts, so that this file does not hold what it looks for.
const REGISTRIES = [['registry', 'npmjs', 'org'], ['registry', 'yarnpkg', 'com'], ['npm', 'pkg', 'github', 'com'], ['deb', 'debian', 'org']];
const MACHINE_FOLDERS = ['work', 'tmp', 'root', 'home', 'Users'];
const OUTSIDE = ['..', 'shared'].join('/');

const registry = new RegExp(REGISTRIES.map((parts) => parts.join('\\.')).join('|'), 'i');
const registrySetting = /"resolved"\s*:|^registry\s*=/m;
// A folder at the root of a disk: nothing that belongs to a longer path or an address stands before it.
const machinePath = new RegExp(`(?<![\\w.@*)}\\]>~/-])/(${MACHINE_FOLDERS.join('|')})/[\\w.-]+`);

/** What in a text ties it to one machine: a registry's host, a path of a disk, a folder outside the project. */
export function machineTraces(text: string): string[] {
  const found = [registry, registrySetting, machinePath].flatMap((pattern) => pattern.exec(text)?.[0] ?? []);
  return text.includes(OUTSIDE) ? [...found, OUTSIDE] : found;
}
