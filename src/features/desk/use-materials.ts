import { useCallback, useMemo, useState } from 'react';
import type { DeskView } from '#contracts/entries.ts';
import { AppError } from '#contracts/errors.ts';
import type { MaterialInput, MaterialOutcome } from '#src/blocks/bench.ts';
import type { MaterialFacts } from '#src/blocks/pure.ts';
import { useAddMaterial } from '#src/queries/materials.ts';

/** How often each material was drawn, for offering the usual ones first. */
function usesOf(view: DeskView): Map<number, number> {
  const uses = new Map<number, number>();
  for (const { material, rows } of view.history) uses.set(material, (uses.get(material) ?? 0) + rows.filter(({ kind }) => kind === 'used' || kind === 'wasted').length);
  return uses;
}

/** The restorer's materials, most used first, with those added at this desk. */
export function useMaterials(view: DeskView) {
  const [added, setAdded] = useState<readonly MaterialFacts[]>([]);
  const { mutateAsync } = useAddMaterial(view.build.slug);
  const materials = useMemo(() => {
    const uses = usesOf(view);
    const known = new Set(view.materials.map(({ id }) => id));
    const all = [...view.materials, ...added.filter(({ id }) => !known.has(id))];
    return all.toSorted((a, b) => (uses.get(b.id) ?? 0) - (uses.get(a.id) ?? 0) || a.name.localeCompare(b.name, 'en'));
  }, [view, added]);
  const byId = useMemo(() => new Map(materials.map((material) => [material.id, material])), [materials]);
  const addMaterial = useCallback(async (input: MaterialInput): Promise<MaterialOutcome> => {
    try {
      const material = await mutateAsync(input);
      setAdded((now) => [...now, material]);
      return { ok: true, material };
    } catch (cause) {
      if (!(cause instanceof AppError)) throw cause;
      return { ok: false, problem: cause.message, fields: cause.fields ?? {} };
    }
  }, [mutateAsync]);
  return { materials, byId, addMaterial };
}
