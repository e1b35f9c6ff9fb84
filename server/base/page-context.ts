import { headers } from 'next/headers';
import { redirect } from 'next/navigation';
import { cache } from 'react';
import { paths } from '@/lib/paths';
import { may, type Permission } from '@/lib/permissions';
import type { PersonContext } from './context';
import { personContext } from './person-context';

const current = cache(async () => personContext(await headers()));

/** For pages: who is signed in, or off to the door. A page that a role may not see sends it home. */
export async function pageContext(permission: Permission): Promise<PersonContext> {
  const ctx = await current();
  if (!ctx) redirect(paths.signIn());
  if (!may(ctx.actor.role, permission)) redirect(homeOf(ctx));
  return ctx;
}

/** For the front page and the door, which anyone may see. */
export async function visitorContext(): Promise<PersonContext | null> {
  return current();
}

/** Where each role's day begins. */
export function homeOf(ctx: PersonContext): string {
  const { role } = ctx.actor;
  if (role === 'measurer' || role === 'crew') return paths.today();
  return role === 'bench' ? paths.bench() : paths.diary();
}
