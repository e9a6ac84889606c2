export const roles = ['dispatcher', 'driver', 'supervisor', 'yard', 'administrator', 'observer'] as const;
export type Role = (typeof roles)[number];

export const roleNames: Readonly<Record<Role, string>> = {
  dispatcher: 'Dispatcher',
  driver: 'Driver',
  supervisor: 'Supervisor',
  yard: 'Yard hand',
  administrator: 'Administrator',
  observer: 'Observer',
};

/** The signed-in person, as far as rules about them need to know. */
export interface Actor {
  id: number;
  name: string;
  role: Role;
}

/** What "own" is judged on. */
export interface Subject {
  driverId?: number | null;
  personId?: number | null;
}

type Grant = 'all' | 'own';

interface Rule {
  /** completes "Only … may" */
  does: string;
  grants: Partial<Record<Role, Grant>>;
  isOwn?: (actor: Actor, subject: Subject) => boolean;
}

const all = (...granted: Role[]): Partial<Record<Role, Grant>> =>
  Object.fromEntries(granted.map((role) => [role, 'all']));
const everyone = all(...roles);
const ownRun = (actor: Actor, subject: Subject) => subject.driverId === actor.id;
const self = (actor: Actor, subject: Subject) => subject.personId === actor.id;

/** The one table: action → role → all, own or none. */
export const permissions = {
  'roads.view': { does: 'see the roads', grants: all('dispatcher', 'supervisor', 'yard', 'administrator', 'observer') },
  'storms.view': { does: 'see storms', grants: all('dispatcher', 'supervisor', 'yard', 'administrator', 'observer') },
  'storms.open': { does: 'open, change or close a storm', grants: all('dispatcher', 'supervisor') },
  'plans.work-out': { does: 'work out treatments', grants: all('dispatcher', 'supervisor') },
  'plans.publish': { does: 'publish a plan', grants: all('dispatcher', 'supervisor') },
  'routes.view': { does: 'see routes', grants: all('dispatcher', 'supervisor', 'yard', 'administrator', 'observer') },
  'routes.edit': { does: 'change routes', grants: all('dispatcher', 'supervisor') },
  'crew.view': { does: 'see who is out', grants: all('dispatcher', 'supervisor', 'yard', 'administrator', 'observer') },
  'cab.use': { does: 'use the cab screen', grants: all('driver', 'dispatcher', 'supervisor') },
  'run.start': { does: 'start a run', grants: { driver: 'own', dispatcher: 'all', supervisor: 'all' }, isOwn: ownRun },
  'run.view': {
    does: 'see this run',
    grants: { ...all('dispatcher', 'supervisor', 'yard', 'administrator', 'observer'), driver: 'own' },
    isOwn: ownRun,
  },
  'run.log': {
    does: 'log what was spread',
    grants: { driver: 'own', dispatcher: 'all', supervisor: 'all' },
    isOwn: ownRun,
  },
  'run.finish': {
    does: 'finish a run',
    grants: { driver: 'own', dispatcher: 'all', supervisor: 'all' },
    isOwn: ownRun,
  },
  'load.record': {
    does: 'record a load',
    grants: { driver: 'own', dispatcher: 'all', supervisor: 'all', yard: 'all' },
    isOwn: ownRun,
  },
  'yard.view': { does: 'see the yards', grants: all('dispatcher', 'supervisor', 'yard', 'administrator', 'observer') },
  'ledger.view': { does: 'see the ledger', grants: all('dispatcher', 'supervisor', 'administrator', 'observer') },
  'bench.use': { does: 'use the brine bench', grants: everyone },
  'setup.view': { does: 'see the set-up', grants: all('administrator', 'supervisor', 'dispatcher') },
  'setup.people': { does: 'change people and their roles', grants: all('administrator') },
  'setup.roads': { does: 'change the road network', grants: all('administrator') },
  'setup.stations': { does: 'change stations and their keys', grants: all('administrator') },
  'setup.materials': { does: 'change materials', grants: all('administrator') },
  'setup.fleet': { does: 'change yards, trucks and spreaders', grants: all('administrator') },
  'setup.policy': { does: 'change the treatment policy', grants: all('supervisor') },
  'readings.import': { does: 'load sensor readings', grants: all('administrator', 'dispatcher', 'supervisor') },
  'audit.view': { does: 'see the audit log', grants: all('administrator', 'supervisor') },
  'account.edit': {
    does: 'change this account',
    grants: Object.fromEntries(roles.map((role) => [role, 'own'])),
    isOwn: self,
  },
} as const satisfies Record<string, Rule>;

export type Action = keyof typeof permissions;
export const actions = Object.keys(permissions) as Action[];

export type Decision = { allowed: true } | { allowed: false; reason: string };

/**
 * May `actor` do `action` (to `subject`)? The reason is what a disabled button says.
 * An action granted as "own" needs a subject; without one it is refused.
 */
export function can(actor: Actor, action: Action, subject?: Subject): Decision {
  const rule: Rule = permissions[action];
  const grant = rule.grants[actor.role];
  if (grant === 'all') return { allowed: true };
  if (grant === 'own') {
    return subject && rule.isOwn?.(actor, subject)
      ? { allowed: true }
      : { allowed: false, reason: `A ${roleNames[actor.role].toLowerCase()} may ${rule.does} only for themselves.` };
  }
  return {
    allowed: false,
    reason: `A${/^[aeiou]/i.test(roleNames[actor.role]) ? 'n' : ''} ${roleNames[actor.role].toLowerCase()} may not ${rule.does}.`,
  };
}

/** Whether the role could ever do it: used for navigation and for pages whose content is filtered to "own". */
export function mayEver(role: Role, action: Action): boolean {
  const rule: Rule = permissions[action];
  return rule.grants[role] !== undefined;
}
