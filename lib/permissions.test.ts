import { describe, expect, it } from 'vitest';
import { actions, can, mayEver, roles, type Action, type Role } from './permissions';

/** The table as the agency reads it: a = all, o = own, · = none. Columns in the order of `roles`. */
const expected: Record<Action, string> = {
  //                     dispatcher driver supervisor yard administrator observer
  'roads.view': 'a · a a a a',
  'storms.view': 'a · a a a a',
  'storms.open': 'a · a · · ·',
  'plans.work-out': 'a · a · · ·',
  'plans.publish': 'a · a · · ·',
  'routes.view': 'a · a a a a',
  'routes.edit': 'a · a · · ·',
  'crew.view': 'a · a a a a',
  'cab.use': 'a a a · · ·',
  'run.start': 'a o a · · ·',
  'run.view': 'a o a a a a',
  'run.log': 'a o a · · ·',
  'run.finish': 'a o a · · ·',
  'load.record': 'a o a a · ·',
  'yard.view': 'a · a a a a',
  'ledger.view': 'a · a · a a',
  'bench.use': 'a a a a a a',
  'setup.view': 'a · a · a ·',
  'setup.people': '· · · · a ·',
  'setup.roads': '· · · · a ·',
  'setup.stations': '· · · · a ·',
  'setup.materials': '· · · · a ·',
  'setup.fleet': '· · · · a ·',
  'setup.policy': '· · a · · ·',
  'readings.import': 'a · a · a ·',
  'audit.view': '· · a · a ·',
  'account.edit': 'o o o o o o',
};

const person = (role: Role, id = 7) => ({ id, name: 'Somebody', role });
const own = { driverId: 7, personId: 7 };
const others = { driverId: 8, personId: 8 };

describe('permission table', () => {
  it('has a row for every action', () => {
    expect(Object.keys(expected).sort()).toEqual([...actions].sort());
  });

  for (const action of actions) {
    it(`${action} is allowed exactly as written`, () => {
      const seen = roles.map((role) => {
        const onOwn = can(person(role), action, own).allowed;
        const onOthers = can(person(role), action, others).allowed;
        return onOthers ? 'a' : onOwn ? 'o' : '·';
      });
      expect(seen.join(' ')).toBe(expected[action]);
    });
  }

  it('refuses "own" when nobody says whose it is', () => {
    expect(can(person('driver'), 'run.log').allowed).toBe(false);
  });

  it('says why in a sentence', () => {
    expect(can(person('observer'), 'plans.publish')).toEqual({
      allowed: false,
      reason: 'An observer may not publish a plan.',
    });
    expect(can(person('driver'), 'run.log', others)).toEqual({
      allowed: false,
      reason: 'A driver may log what was spread only for themselves.',
    });
  });

  it('opens pages for those who could ever act there', () => {
    expect(mayEver('driver', 'run.log')).toBe(true);
    expect(mayEver('yard', 'run.log')).toBe(false);
  });
});
