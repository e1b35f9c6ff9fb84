/** What each role may see and do. Screens hide by it; only the server decides. */

export const roles = ['owner', 'scheduler', 'measurer', 'bench', 'crew'] as const;
export type Role = (typeof roles)[number];

/** `read` sees, the rest does. One string for each thing that some role may not. */
export const permissions = [
  'shop:read',
  'shop:change',
  'people:read',
  'people:invite',
  'crews:change',
  'jobs:read',
  'jobs:change',
  /** Everything that is known of one customer, given out or taken away. */
  'customers:export',
  'customers:erase',
  'visits:read',
  'visits:book',
  'visits:override-gate',
  'visits:report',
  'walls:read',
  'walls:measure',
  'runs:change',
  'sheets:read',
  'sheets:release',
  'sheets:take-up',
  'sheets:say-ready',
  'snags:change',
  'messages:read',
  'messages:send',
  'numbers:read',
  /** Keys for other programs, and what they are told. */
  'programs:change',
] as const;
export type Permission = (typeof permissions)[number];

const everyone: Permission[] = [
  'shop:read',
  'people:read',
  'jobs:read',
  'visits:read',
  'walls:read',
  'sheets:read',
];

const allowed: Record<Role, ReadonlySet<Permission>> = {
  owner: new Set(permissions),
  scheduler: new Set<Permission>([
    ...everyone,
    'crews:change',
    'jobs:change',
    'visits:book',
    'visits:override-gate',
    'visits:report',
    'messages:read',
    'messages:send',
    'sheets:say-ready',
    'snags:change',
  ]),
  measurer: new Set<Permission>([
    ...everyone,
    'visits:report',
    'walls:measure',
    'runs:change',
    'sheets:release',
    'snags:change',
  ]),
  bench: new Set<Permission>([...everyone, 'runs:change', 'sheets:take-up', 'sheets:say-ready']),
  crew: new Set<Permission>([...everyone, 'visits:report', 'walls:measure', 'snags:change']),
};

export function may(role: Role, permission: Permission): boolean {
  return allowed[role].has(permission);
}

/** A role from outside; anything unknown is no role at all. */
export function parseRole(text: string): Role | null {
  return roles.find((role) => role === text) ?? null;
}

export const roleWords: Record<Role, string> = {
  owner: 'Owner',
  scheduler: 'Scheduler',
  measurer: 'Measurer',
  bench: 'Bench',
  crew: 'Crew',
};
