import type { Metadata } from 'next';
import { CrewsScreen } from '@/components/crews/crews-screen';
import { TitleBlock } from '@/components/ui/title-block';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';
import { getMapGround } from '@/server/days/get-map-ground';
import { listFeeds } from '@/server/days/list-feeds';
import { getCrews } from '@/server/visits/get-crews';

export const metadata: Metadata = { title: 'Crews and people' };

export default async function CrewsPage() {
  const ctx = await pageContext('people:read');
  const { role, personId } = ctx.actor;
  return (
    <>
      <TitleBlock level={1} title="Crews and people" className="mb-4" />
      <CrewsScreen
        view={await getCrews(ctx)}
        feeds={await listFeeds(ctx)}
        ground={getMapGround(ctx)}
        ownPersonId={personId}
        mayChange={may(role, 'crews:change')}
        mayInvite={may(role, 'people:invite')}
      />
    </>
  );
}
