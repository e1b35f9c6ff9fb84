import type { Metadata } from 'next';
import { CrewForm } from '@/components/crews/crew-form';
import { CrewList } from '@/components/crews/crew-list';
import { InviteForm } from '@/components/crews/invite-form';
import { TitleBlock } from '@/components/ui/title-block';
import { may, roleWords } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { listPeople } from '@/server/people/list-people';
import { listCrews } from '@/server/shops/list-crews';

export const metadata: Metadata = { title: 'Crews and people' };

export default async function CrewsPage() {
  const ctx = await pageContext('people:read');
  const people = await listPeople(ctx);
  const { role } = ctx.actor;
  return (
    <>
      <TitleBlock level={1} title="Crews and people" className="mb-4" />
      <div className="grid gap-x-10 gap-y-8 xl:grid-cols-2">
        <section>
          <TitleBlock title="Crews" />
          <CrewList crews={await listCrews(ctx)} />
          {may(role, 'crews:change') ? <CrewForm people={people} /> : null}
        </section>
        <section>
          <TitleBlock title="People" meta={people.length} />
          <ul>
            {people.map((person) => (
              <li key={person.id} className="flex gap-3 border-b border-rule py-2">
                <b>{person.name}</b>
                <span className="text-graphite">{roleWords[person.role].toLowerCase()}</span>
                <span className="ml-auto text-note">{person.email ?? 'no sign-in'}</span>
              </li>
            ))}
          </ul>
          {may(role, 'people:invite') ? <InviteForm /> : null}
        </section>
      </div>
    </>
  );
}
