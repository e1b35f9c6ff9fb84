import { and, asc, eq, inArray, isNull } from 'drizzle-orm';
import { people, user } from '@/db/schema';
import { type Role, roles, roleWords } from '@/lib/permissions';
import { database } from '@/server/base/database';
import { env } from '@/server/base/env';

/** Printed by the demo's start and shown on its sign-in page; it opens an invented shop only. */
const demoPassword = 'setwell-demo';
const demoEmails = roles.map((role) => `${role}@juniperbend.example`);

const does: Record<Role, string> = {
  owner: 'sees everything and sets the shop’s rules',
  scheduler: 'books measures and installs',
  measurer: 'reads the walls on a phone',
  bench: 'builds to the released sheet',
  crew: 'sets the cabinets',
};

/** The people that the sign-in page offers with one tap; nobody outside the demo. */
export async function listDemoPeople() {
  if (!env().demo) return [];
  const { db } = await database();
  const found = await db
    .select({ name: people.name, role: people.role, email: user.email })
    .from(people)
    .innerJoin(user, eq(user.id, people.userId))
    .where(and(inArray(user.email, demoEmails), isNull(people.leftAt)))
    .orderBy(asc(people.createdAt), asc(people.id));
  return roles.flatMap((role) => {
    const person = found.find((candidate) => candidate.role === role);
    if (!person) return [];
    const { name, email } = person;
    return { name, role: roleWords[role], does: does[role], email, password: demoPassword };
  });
}
