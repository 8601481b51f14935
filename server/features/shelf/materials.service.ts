import { UniqueConstraintViolationException } from '@mikro-orm/core';
import type { ParsedOf } from '#contracts/endpoint.ts';
import { AppError, type FieldProblems } from '#contracts/errors.ts';
import { dimensions, type addMaterial, type MaterialView } from '#contracts/materials.ts';
import { exactText } from '#domain/quantity.ts';
import { readQuantity, type Pack, type Ratio } from '#domain/quantity-reading.ts';
import { unitsFor, type Dimension, type Measures } from '#domain/units.ts';
import type { MaterialFacts } from '#src/blocks/pure.ts';
import { Build, Material, Person } from '#server/entities/index.ts';
import { requireCrewBuild, requireWritableBuild } from '#server/features/builds/build-access.service.ts';
import type { Caller, Em } from '#server/http/context.ts';
import { materialsSeen, sees } from './build-materials.service.ts';

export type NewMaterial = Omit<ParsedOf<typeof addMaterial>['body'], 'build'>;
type MaterialDimension = MaterialView['dimension'];

function isMaterialDimension(dimension: Dimension): dimension is MaterialDimension {
  return dimensions.some((one) => one === dimension);
}

// Dimensions are checked as they come in, so what is stored always has one of a material's.
function dimensionOf(material: Material): MaterialDimension {
  if (!isMaterialDimension(material.dimension)) throw new RangeError(`Material ${material.id} is measured by ${material.dimension}`);
  return material.dimension;
}

function ratioView(ratio: Ratio | null | undefined): MaterialView['ratio'] {
  return ratio && isMaterialDimension(ratio.to) ? { to: ratio.to, amount: ratio.amount, about: ratio.about } : null;
}

export function materialView(material: Material): MaterialView {
  return {
    id: material.id, name: material.name, dimension: dimensionOf(material), unit: material.unit,
    packs: material.packs, ratio: ratioView(material.ratio), hazards: material.hazards,
  };
}

/** A restorer's materials, by name. @param seen only those, or null for all */
export async function materialsOf(em: Em, ownerId: number, seen: ReadonlySet<number> | null = null): Promise<MaterialView[]> {
  const materials = await em.find(Material, { owner: ownerId }, { orderBy: { nameKey: 'asc' } });
  return materials.filter(({ id }) => sees(seen, id)).map(materialView);
}

/** What blocks need to know of a restorer's materials. */
export async function materialFacts(em: Em, ownerId: number): Promise<Map<number, MaterialFacts>> {
  const materials = await em.find(Material, { owner: ownerId });
  return new Map(materials.map(({ id, name, dimension, unit, packs, ratio, hazards }) => [id, { id, name, dimension, unit, packs, ratio: ratio ?? null, hazards }]));
}

interface Bench { readonly ownerId: number; readonly measures: Measures; readonly build: Build | null }

/** Whose list is added to, and by what measures it is read: the build's, else those of one's own newest build. */
async function benchOf(em: Em, caller: Caller, slug: string | undefined): Promise<Bench> {
  if (slug !== undefined) {
    const build = await requireWritableBuild(em, caller, slug);
    return { ownerId: build.owner.id, measures: build.measures, build };
  }
  const newest = await em.findOne(Build, { owner: caller.id }, { orderBy: { id: 'desc' } });
  return { ownerId: caller.id, measures: newest?.measures ?? 'imperial', build: null };
}

export async function listMaterials(em: Em, caller: Caller, slug: string | undefined): Promise<MaterialView[]> {
  if (slug === undefined) return materialsOf(em, caller.id);
  const build = await requireCrewBuild(em, caller, slug);
  return materialsOf(em, build.owner.id, await materialsSeen(em, caller, build));
}

function readPacks(input: NewMaterial, measures: Measures, fields: Record<string, string>): Pack[] {
  const names = new Set<string>();
  return input.packs.flatMap(({ name, amount }, index) => {
    if (names.has(name.toLowerCase())) fields[`packs.${index}.name`] = `There is already a ${name} among the packs.`;
    names.add(name.toLowerCase());
    const reading = readQuantity(amount, { measures, dimension: input.dimension });
    if (!reading.ok) fields[`packs.${index}.amount`] = reading.problem;
    return reading.ok ? [{ name, amount: exactText(reading.value.quantity.amount) }] : [];
  });
}

/** The unit amounts are shown in: one of the dimension's, or a pack's name; the first offered where none was picked. */
function readUnit(input: NewMaterial, measures: Measures, fields: Record<string, string>): string {
  const offered = unitsFor(input.dimension, measures);
  const typed = input.unit.trim();
  const known = offered.find(({ id, one, many }) => [id, one, many].includes(typed))?.id ?? input.packs.find(({ name }) => name === typed)?.name;
  if (typed !== '' && known === undefined) fields['unit'] = 'Pick a unit from the list, or one of the packs.';
  return known ?? offered[0]?.id ?? '';
}

/** @param listed whether who adds it sees the one that is there */
function nameTaken(name: string, listed: boolean): AppError {
  const fields: FieldProblems = {
    name: listed ? `There is already a material called “${name}”. Pick it from the list, or give this one another name.`
      : `The restorer keeps a “${name}” that is not on the list of this build. Give this one another name, or ask the restorer to use it here first.`,
  };
  return new AppError('already-taken', 'A material of that name is there already.', fields);
}

async function isListed(em: Em, caller: Caller, { ownerId, build }: Bench, name: string): Promise<boolean> {
  const there = await em.fork().findOne(Material, { owner: ownerId, nameKey: name.toLowerCase() });
  return !there || !build || sees(await materialsSeen(em, caller, build), there.id);
}

/** Adds a material to a restorer's list. The unique index on the name closes the race between two who add it at once. */
async function createMaterial(em: Em, caller: Caller, bench: Bench, input: NewMaterial): Promise<Material> {
  const fields: Record<string, string> = {};
  const packs = readPacks(input, bench.measures, fields);
  const unit = readUnit(input, bench.measures, fields);
  if (Object.keys(fields).length > 0) throw new AppError('bad-input', 'Some of this needs mending.', fields);
  const name = input.name.trim().replace(/\s+/g, ' ');
  const material = em.create(Material, {
    owner: em.getReference(Person, bench.ownerId), addedFor: bench.build, name, nameKey: name.toLowerCase(), dimension: input.dimension, unit, ratio: null, packs, hazards: input.hazards ?? [],
  });
  try {
    await em.persist(material).flush();
  } catch (error) {
    if (error instanceof UniqueConstraintViolationException) throw nameTaken(name, await isListed(em, caller, bench, name));
    throw error;
  }
  return material;
}

/** Adds a material to one's own list, or to that of the owner of a build one works on. */
export async function addToMaterials(em: Em, caller: Caller, slug: string | undefined, input: NewMaterial): Promise<MaterialView> {
  return materialView(await createMaterial(em, caller, await benchOf(em, caller, slug), input));
}
