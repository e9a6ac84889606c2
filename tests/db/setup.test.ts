import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { addPerson } from '@/db/commands/add-person';
import { adoptPolicy } from '@/db/commands/adopt-policy';
import { changePassword } from '@/db/commands/change-password';
import { changePreferences } from '@/db/commands/change-preferences';
import { changePerson } from '@/db/commands/change-person';
import { disablePerson } from '@/db/commands/disable-person';
import { saveMaterial } from '@/db/commands/save-material';
import { saveSpreader } from '@/db/commands/save-spreader';
import { saveTruck } from '@/db/commands/save-truck';
import { saveYard } from '@/db/commands/save-yard';
import { signIn } from '@/db/commands/sign-in';
import { listSpreaders, listTrucks, listYards } from '@/db/queries/fleet';
import { listMaterials } from '@/db/queries/materials';
import { findPerson } from '@/db/queries/people';
import { listPolicies } from '@/db/queries/policy';
import { selectRows } from '@/db/transaction';
import { SaveMaterialInput } from '@/lib/contracts/materials';
import { AdoptPolicyInput, PolicyRules, readPolicy } from '@/lib/contracts/policy';
import { defaultPolicy } from '@/lib/treatment/policy';
import { testDatabase, type TestDatabase } from '../setup/database';

const now = new Date('2026-12-01T02:40:00Z');
let database: TestDatabase;
let administratorId = 0;

const sessionVersion = async (id: number) => (await findPerson({ id }))?.sessionVersion;
const audited = async (action: string) =>
  (await selectRows<{ id: number }>('select id from audit_log where action = :action', { action })).length;

beforeAll(async () => {
  database = await testDatabase();
  // The first person of a new database is nobody's work yet: the audit row names none.
  const [row] = await selectRows<{ id: number }>(
    `insert into people (name, email, password_hash, role) values ('Ada First', 'ada@example.org', 'x', 'administrator') returning id`,
  );
  administratorId = row?.id ?? 0;
});
afterAll(() => database.close());

const driver = (email: string) =>
  addPerson({
    input: { name: 'Dee Driver', email, role: 'driver', password: 'ten or more' },
    by: administratorId,
    now,
  });

describe('people', () => {
  it('a change of role ends their sessions, a change of name does not', async () => {
    const { id } = await driver('one@example.org');
    await changePerson({ input: { id, name: 'Dee Renamed', role: 'driver' }, by: administratorId, now });
    expect(await sessionVersion(id)).toBe(1);
    await changePerson({ input: { id, name: 'Dee Renamed', role: 'observer' }, by: administratorId, now });
    expect(await sessionVersion(id)).toBe(2);
    expect(await audited('setup.people.change')).toBe(2);
  });

  it('a disabled person is signed out and cannot sign in', async () => {
    const email = 'two@example.org';
    const { id } = await driver(email);
    const attempt = { email, password: 'ten or more', address: 'here', now };
    expect(await signIn(attempt)).toMatchObject({ id });
    await disablePerson({ input: { id, isDisabled: true }, by: administratorId, now });
    expect(await sessionVersion(id)).toBe(2);
    expect(await signIn(attempt)).toBeNull();
  });

  it('the only administrator can neither be disabled nor lose the role', async () => {
    const input = { id: administratorId, name: 'Ada First', role: 'observer' as const };
    await expect(changePerson({ input, by: administratorId, now })).rejects.toMatchObject({ code: 'not-possible-now' });
    const { id } = await driver('three@example.org');
    await expect(
      disablePerson({ input: { id: administratorId, isDisabled: true }, by: id, now }),
    ).rejects.toMatchObject({ code: 'not-possible-now' });
    expect((await findPerson({ id: administratorId }))?.role).toBe('administrator');
  });

  it('an address is used once', async () => {
    await driver('four@example.org');
    await expect(driver('four@example.org')).rejects.toMatchObject({ code: 'already-exists' });
  });

  it('a password changes only for who knows the old one, and ends every session', async () => {
    const { id } = await driver('five@example.org');
    const next = 'another long one';
    await expect(
      changePassword({ input: { current: 'a guess', next, repeat: next }, by: id, now }),
    ).rejects.toMatchObject({ code: 'invalid-input' });
    await changePassword({ input: { current: 'ten or more', next, repeat: next }, by: id, now });
    expect(await sessionVersion(id)).toBe(2);
    expect(await signIn({ email: 'five@example.org', password: next, address: 'here', now })).toMatchObject({ id });
  });
});

describe('materials', () => {
  const typed = (fields: Record<string, unknown>) =>
    SaveMaterialInput.parse({ id: null, practicalMinimumC: '', isActive: 'on', ...fields });
  const save = (input: SaveMaterialInput) => saveMaterial({ input, by: administratorId, now });

  it('a pre-wetted solid is made and priced by its parts, and follows when one changes', async () => {
    const solid = {
      form: 'solid',
      name: 'Rock salt',
      composition: { NaCl: '0.96', CaCl2: '' },
      waterMassFraction: '0.02',
      densityKgPerM3: '1280',
      costCentsPerTonne: '7000',
    };
    const rock = await save(typed(solid));
    const brine = await save(
      typed({
        form: 'liquid',
        name: 'Salt brine',
        composition: { NaCl: '0.23' },
        waterMassFraction: '0.77',
        densityKgPerM3: '1170',
        costCentsPerTonne: '2000',
      }),
    );
    await save(
      typed({
        form: 'prewet',
        name: 'Wetted salt',
        solidMaterialId: rock.id,
        liquidMaterialId: brine.id,
        liquidMassFraction: '0.3',
      }),
    );
    const wetted = async () => (await listMaterials()).find((material) => material.name === 'Wetted salt');
    expect((await wetted())?.composition.NaCl).toBeCloseTo(0.7 * 0.96 + 0.3 * 0.23, 12);
    expect((await wetted())?.costCentsPerTonne).toBe(5500);
    await save(typed({ ...solid, id: rock.id, costCentsPerTonne: '9000' }));
    expect((await wetted())?.costCentsPerTonne).toBe(6900);
    expect(await audited('setup.materials.change')).toBe(1);
  });

  it('salts and water over 100 % are refused, and so is a de-icer without salt', () => {
    const liquid = { id: null, form: 'liquid', name: 'X', densityKgPerM3: '1200', costCentsPerTonne: '1' };
    const over = SaveMaterialInput.safeParse({ ...liquid, composition: { NaCl: '0.3' }, waterMassFraction: '0.8' });
    expect(over.error?.issues[0]?.path).toEqual(['waterMassFraction']);
    const none = SaveMaterialInput.safeParse({ ...liquid, composition: { NaCl: '' }, waterMassFraction: '1' });
    expect(none.error?.issues.map((issue) => issue.path[0])).toContain('composition');
  });

  it('nothing typed is missing, not zero', () => {
    const blank = SaveMaterialInput.safeParse({
      id: null,
      form: 'solid',
      name: 'X',
      composition: { NaCl: '1' },
      waterMassFraction: '',
      densityKgPerM3: '',
      costCentsPerTonne: '',
    });
    expect(blank.error?.issues.map((issue) => issue.path[0])).toEqual([
      'waterMassFraction',
      'densityKgPerM3',
      'costCentsPerTonne',
    ]);
  });
});

describe('fleet', () => {
  it('a yard, its truck and the spreader on it are kept and changed', async () => {
    const yard = { name: 'Depot', longitudeDeg: -3.2, latitudeDeg: 58.9, solidCapacityKg: 5e5, brineCapacityL: 4e4 };
    const { id: yardId } = await saveYard({ input: { id: null, ...yard, isActive: true }, by: administratorId, now });
    const truck = { number: 4, name: 'Tipper', yardId, ploughWidthM: null, isActive: true };
    const { id: truckId } = await saveTruck({ input: { id: null, ...truck }, by: administratorId, now });
    const spreader = {
      id: null,
      truckId,
      name: 'Disc',
      hopperKg: 7500,
      tankL: 1200,
      minRateGPerM2: 5,
      maxRateGPerM2: 40,
      maxLiquidRateMlPerM2: null,
      calibratedOn: '2026-11-04',
    };
    await saveSpreader({ input: spreader, by: administratorId, now });
    await saveTruck({ input: { id: truckId, ...truck, ploughWidthM: 3 }, by: administratorId, now });
    expect(await listYards()).toMatchObject([{ name: 'Depot', longitudeDeg: -3.2, latitudeDeg: 58.9 }]);
    expect(await listTrucks()).toMatchObject([{ number: 4, yardName: 'Depot', ploughWidthM: 3 }]);
    expect(await listSpreaders()).toMatchObject([{ hopperKg: 7500, calibratedOn: '2026-11-04' }]);
    await expect(saveTruck({ input: { id: null, ...truck }, by: administratorId, now })).rejects.toMatchObject({
      code: 'already-exists',
    });
  });
});

describe('policy', () => {
  const rules = PolicyRules.parse({ ...defaultPolicy, marginMin: '20' });

  it('a version that names nothing reads as the default policy', () => {
    expect(readPolicy({})).toEqual(defaultPolicy);
    expect(readPolicy(rules).marginMin).toBe(20);
  });

  it('a least rate above the most is refused', () => {
    const turned = { ...defaultPolicy, minRateGPerM2: { ...defaultPolicy.minRateGPerM2, solid: 50 } };
    const answer = AdoptPolicyInput.safeParse({ basedOnVersion: 0, rules: turned });
    expect(answer.error?.issues[0]?.path).toEqual(['rules', 'maxRateGPerM2', 'solid']);
  });

  it('is adopted in versions, and never over a version one has not seen', async () => {
    const adopt = (basedOnVersion: number) =>
      adoptPolicy({ input: { basedOnVersion, rules }, by: administratorId, now });
    expect(await adopt(0)).toEqual({ version: 1 });
    await expect(adopt(0)).rejects.toMatchObject({ code: 'changed-meanwhile' });
    expect(await adopt(1)).toEqual({ version: 2 });
    expect((await listPolicies()).map(({ version, adoptedByName }) => [version, adoptedByName])).toEqual([
      [2, 'Ada First'],
      [1, 'Ada First'],
    ]);
  });
});

describe('preferences', () => {
  it('what is not named stays as it is', async () => {
    await changePreferences({ input: { unitSystem: 'us' }, by: administratorId, now });
    await changePreferences({ input: { theme: 'dark' }, by: administratorId, now });
    expect(await findPerson({ id: administratorId })).toMatchObject({ unitSystem: 'us', theme: 'dark' });
  });
});
