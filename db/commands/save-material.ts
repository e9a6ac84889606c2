import {
  type SaveMaterialInput,
  type SavePrewetMaterialInput,
  type SaveSingleMaterialInput,
} from '@/lib/contracts/materials';
import { Problem } from '@/lib/problem';
import { database } from '../connection';
import { type Material } from '../models/material';
import { inTransaction, type Tx } from '../transaction';
import { recordAudit } from './audit';
import { type By } from './people-rules';

type Composition = Record<string, number>;

interface Mixed {
  composition: Composition;
  waterMassFraction: number;
  densityKgPerM3: number;
  costCentsPerTonne: number;
}

const compositionOf = (material: Material): Composition => material.composition as Composition;

/** What a pre-wetted product is made of and costs, by mass of its two parts; its bulk is the solid's. */
function mix(solid: Material, liquid: Material, liquidMassFraction: number): Mixed {
  const blend = (ofSolid: number, ofLiquid: number) =>
    ofSolid * (1 - liquidMassFraction) + ofLiquid * liquidMassFraction;
  const names = new Set([...Object.keys(compositionOf(solid)), ...Object.keys(compositionOf(liquid))]);
  const composition = Object.fromEntries(
    [...names].map((name) => [name, blend(compositionOf(solid)[name] ?? 0, compositionOf(liquid)[name] ?? 0)]),
  );
  return {
    composition,
    waterMassFraction: blend(solid.waterMassFraction, liquid.waterMassFraction),
    densityKgPerM3: solid.densityKgPerM3,
    costCentsPerTonne: Math.round(blend(solid.costCentsPerTonne, liquid.costCentsPerTonne)),
  };
}

async function findPart(tx: Tx, id: number, form: 'solid' | 'liquid'): Promise<Material> {
  const part = await database().models.Material.findByPk(id, { transaction: tx });
  if (part?.form === form) return part;
  const field = form === 'solid' ? 'solidMaterialId' : 'liquidMaterialId';
  throw new Problem('invalid-input', {}, { [field]: `Choose a ${form} of the list.` });
}

async function rowOfPrewet(tx: Tx, input: SavePrewetMaterialInput) {
  const solid = await findPart(tx, input.solidMaterialId, 'solid');
  const liquid = await findPart(tx, input.liquidMaterialId, 'liquid');
  return { ...input, ...mix(solid, liquid, input.liquidMassFraction) };
}

function rowOfSingle(input: SaveSingleMaterialInput) {
  const composition = Object.fromEntries(
    Object.entries(input.composition).flatMap(([salt, share]) => (share ? [[salt, share] as const] : [])),
  );
  return { ...input, composition, solidMaterialId: null, liquidMaterialId: null, liquidMassFraction: null };
}

/** What is mixed from a changed material changes with it. */
async function mixAgain(tx: Tx, partId: number): Promise<void> {
  const { Material } = database().models;
  const prewets = await Material.findAll({ where: { form: 'prewet' }, transaction: tx });
  for (const prewet of prewets) {
    const { solidMaterialId, liquidMaterialId, liquidMassFraction } = prewet;
    if (solidMaterialId === null || liquidMaterialId === null || liquidMassFraction === null) continue;
    if (solidMaterialId !== partId && liquidMaterialId !== partId) continue;
    const solid = await findPart(tx, solidMaterialId, 'solid');
    const liquid = await findPart(tx, liquidMaterialId, 'liquid');
    await prewet.update(mix(solid, liquid, liquidMassFraction), { transaction: tx });
  }
}

async function changeMaterial(
  tx: Tx,
  id: number,
  row: Awaited<ReturnType<typeof rowOfPrewet>> | ReturnType<typeof rowOfSingle>,
) {
  const material = await database().models.Material.findByPk(id, { transaction: tx, lock: true });
  if (!material) throw new Problem('not-found', { what: 'material' });
  if (material.form !== row.form) {
    throw new Problem('not-possible-now', {
      reason: 'The form of a material cannot change: plans and loads refer to it.',
      todo: 'Add a new material and take this one out of use.',
    });
  }
  const before = material.get({ plain: true });
  await material.update({ ...row, id }, { transaction: tx });
  return { material, before };
}

/** Adds a material, or changes one. Plans already worked out keep the rates they were made with. */
export async function saveMaterial({ input, by }: By<SaveMaterialInput>): Promise<{ id: number }> {
  return inTransaction(async (tx) => {
    const row = input.form === 'prewet' ? await rowOfPrewet(tx, input) : rowOfSingle(input);
    const { id: givenId, ...values } = row;
    const { material, before } =
      givenId === null
        ? { material: await database().models.Material.create(values, { transaction: tx }), before: null }
        : await changeMaterial(tx, givenId, row);
    if (before) await mixAgain(tx, material.id);
    await recordAudit(tx, {
      personId: by,
      action: before ? 'setup.materials.change' : 'setup.materials.add',
      subjectKind: 'material',
      subjectId: material.id,
      detail: { before, after: values },
    });
    return { id: material.id };
  });
}
