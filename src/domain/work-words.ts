// Light: no imports, so that any page may say what was done.

const unitWords: Readonly<Record<string, string>> = { m: 'm', m2: 'm²', ft: 'ft', ft2: 'ft²', h: 'h' };

/** Whether a kind of work is counted by measure (`3.2 m² of laminate`) and not by the piece (`17 steamed ribs`). */
export function isMeasured(unit: string): boolean {
  return Object.hasOwn(unitWords, unit);
}

/** "steamed rib", "m² of laminate": one unit of it, after "one" or "an". */
export function oneOfWork({ unit, kind }: { unit: string; kind: string }): string {
  return isMeasured(unit) ? `${unitWords[unit]} of ${kind}` : kind;
}

/** A kind of work by the one name it goes by: small letters, single spaces. */
export function workKindName(typed: string): string {
  return typed.trim().toLowerCase().replace(/\s+/g, ' ');
}
