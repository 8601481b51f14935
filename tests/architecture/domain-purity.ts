import { parseSync } from 'vite';

// A clock, chance, the network, the page or the process: what the same input could answer differently by.
const IMPURE = [
  /\bDate\.now\b/, /\bnew Date\(\s*\)/, /(?<!new )\bDate\(/, /\bMath\.random\b/, /\bcrypto\b/, /\bfetch\b/, /\bprocess\b/,
  /\bglobalThis\b/, /\bwindow\b/, /\bdocument\b/, /\blocalStorage\b/, /\bperformance\b/, /\bset(Timeout|Interval|Immediate)\b/,
  /\bIntl\b/, /\btoLocale\w+/, /\bconsole\b/,
];

function codeOnly(path: string, source: string): string {
  const { comments } = parseSync(path, source);
  let code = source;
  for (const { start, end } of comments) code = code.slice(0, start) + ' '.repeat(end - start) + code.slice(end);
  // Words in messages are not code.
  return code.replace(/'(?:[^'\\\n]|\\.)*'|"(?:[^"\\\n]|\\.)*"/g, "''");
}

/** What a module of the domain reaches for outside its arguments. */
export function impureUses(path: string, source: string): string[] {
  const code = codeOnly(path, source);
  return IMPURE.flatMap((pattern) => pattern.exec(code)?.[0] ?? []);
}
