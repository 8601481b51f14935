import { useCallback, useMemo, useState } from 'react';
import type { DeskReckoning } from './desk-ledger.ts';
import { deskFaults, type DeskFault } from './faults.ts';

/** Which faults are shown: of fields that were left, of all once signing off was tried, and what the server found. */
export function useFaults(reckoning: DeskReckoning, attempted: boolean, serverFaults: Readonly<Record<string, string>>) {
  const [touched, setTouched] = useState<ReadonlySet<string>>(new Set());
  const touch = useCallback((path: string) => setTouched((now) => (now.has(path) ? now : new Set(now).add(path))), []);
  const { faults } = reckoning.derived;
  const fault = useCallback(
    (path: string) => (attempted || touched.has(path) ? faults[path] : undefined) ?? serverFaults[path],
    [attempted, touched, faults, serverFaults],
  );
  const shown: DeskFault[] = useMemo(() => {
    const seen = Object.entries(faults).filter(([path]) => attempted || touched.has(path));
    return deskFaults({ ...serverFaults, ...Object.fromEntries(seen) }, reckoning.document);
  }, [faults, attempted, touched, serverFaults, reckoning.document]);
  return { touch, fault, shown };
}
