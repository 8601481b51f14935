// Words that say nothing about what is inside.
const EMPTY_WORDS = new Set(['util', 'utils', 'helper', 'helpers', 'misc', 'common', 'manager', 'managers']);
// Names that a tool looks for as they are written.
const TOOL_NAMES = new Set(['README.md', 'DEVELOPERS.md', 'LICENSE']);
// The ORM's own name for a migration, recorded in the database.
const MIGRATION = /^server\/migrations\/Migration\d{14}_[a-z0-9_]+\.ts$/;
const KEBAB = /^\.?[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+(-[a-z0-9]+)*)*$/;

/** Says what is wrong with the name of one file or of a folder on its path, or null. */
export function nameProblem(path: string): string | null {
  const parts = path.split('/');
  if (MIGRATION.test(path) || TOOL_NAMES.has(path)) return null;
  const badCase = parts.find((part) => !KEBAB.test(part));
  if (badCase !== undefined) return `${path}: ${badCase} is not kebab-case`;
  const empty = parts.find((part) => part.split('.').some((word) => EMPTY_WORDS.has(word) || EMPTY_WORDS.has(word.split('-').at(-1) ?? '')));
  return empty === undefined ? null : `${path}: ${empty} does not say what it is for`;
}
