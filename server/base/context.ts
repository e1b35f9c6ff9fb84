import type { Database } from '@/db/database';
import type { ShopRules } from '@/lib/contracts/shop-rules';
import type { Permission, Role } from '@/lib/permissions';
import { may } from '@/lib/permissions';
import type { Log } from './log';
import { refused, refusedToKey } from './problem-response';

export type Shop = {
  id: string;
  name: string;
  phone: string;
  email: string;
  region: 'US' | 'UK' | 'AU' | 'EU';
  zone: string;
  rules: ShopRules;
  /** To play with: nobody is told anything from it. */
  isSample?: boolean;
};

export type PersonActor = {
  kind: 'person';
  personId: string;
  userId: string;
  name: string;
  role: Role;
  /** Asking through another program: no more than its key was given. */
  scopes?: ReadonlySet<Permission>;
};
export type CustomerActor = { kind: 'customer'; name: string; customerId: string; visitId: string };
export type SystemActor = { kind: 'system'; name: string };
export type Actor = PersonActor | CustomerActor | SystemActor;

/** What every verb is given first: for which shop, by whom, on what, when. */
export type Context<A extends Actor = Actor> = {
  shop: Shop;
  actor: A;
  db: Database;
  now: Date;
  log: Log;
};
export type PersonContext = Context<PersonActor>;
export type CustomerContext = Context<CustomerActor>;

/** The first line of every verb that a person calls. */
export function mustBeAllowed(ctx: PersonContext, permission: Permission): void {
  const { role, scopes } = ctx.actor;
  if (!may(role, permission)) throw refused();
  if (scopes && !scopes.has(permission)) throw refusedToKey(permission);
}
