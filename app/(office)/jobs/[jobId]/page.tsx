import type { Metadata } from 'next';
import { BookNext } from '@/components/jobs/book-next';
import { CustomerData } from '@/components/jobs/customer-data';
import { JobFacts } from '@/components/jobs/job-facts';
import { JobFiles } from '@/components/jobs/job-files';
import { JobStory } from '@/components/jobs/job-story';
import { RoomList } from '@/components/jobs/room-list';
import { SiteForm } from '@/components/jobs/site-form';
import { JobPhotos } from '@/components/photos/job-photos';
import { SitePlace } from '@/components/place/site-place';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { SignOffList } from '@/components/sign-off/sign-off-list';
import { ForCrewForm } from '@/components/snags/for-crew-form';
import { JobSnags } from '@/components/snags/job-snags';
import { TitleBlock } from '@/components/ui/title-block';
import { may } from '@/lib/permissions';
import { stageWords } from '@/lib/schedule/stages';
import { found } from '@/server/base/found';
import { pageContext } from '@/server/base/page-context';
import { getForCrew } from '@/server/days/get-for-crew';
import { getMapGround } from '@/server/days/get-map-ground';
import { listJobFiles } from '@/server/files/list-job-files';
import { listPhotos } from '@/server/files/list-photos';
import { getJob } from '@/server/jobs/get-job';
import { listSignOffs } from '@/server/snags/list-sign-offs';
import { listSnags } from '@/server/snags/list-snags';
import { listRooms } from '@/server/walls/list-rooms';

export const metadata: Metadata = { title: 'Job' };

export default async function JobPage({ params }: { params: Promise<{ jobId: string }> }) {
  const ctx = await pageContext('jobs:read');
  const { jobId } = await params;
  const job = await found(getJob(ctx, { jobId }));
  const rooms = await listRooms(ctx, { jobId });
  const photos = await listPhotos(ctx, { jobId });
  const papers = await listJobFiles(ctx, { jobId });
  const snags = await listSnags(ctx, { jobId });
  const signOffs = await listSignOffs(ctx, { jobId });
  const forCrew = await getForCrew(ctx, { jobId });
  return (
    <>
      <LiveRefresh topics={['jobs', 'visits', 'messages', 'releases', 'site']} />
      <TitleBlock
        level={1}
        title={`${job.customerName} · ${job.title}`}
        meta={`job ${job.number} · ${stageWords[job.stage]}`}
      />
      <div className="mt-4 grid items-start gap-x-10 gap-y-6 xl:grid-cols-2">
        <div className="flex min-w-0 flex-col gap-6">
          <section>
            <TitleBlock title="Who and where" />
            <JobFacts
              job={job}
              region={ctx.shop.region}
              mayRead={may(ctx.actor.role, 'messages:read')}
            />
            {may(ctx.actor.role, 'visits:book') ? <BookNext job={job} /> : null}
            {may(ctx.actor.role, 'jobs:change') ? (
              <SitePlace job={job} ground={getMapGround(ctx)} />
            ) : null}
          </section>
          {may(ctx.actor.role, 'jobs:change') ? (
            <section>
              <TitleBlock title="State of the site" />
              <SiteForm
                job={job}
                key={JSON.stringify([job.notReady, job.floorAgreed, job.wallsReady])}
              />
            </section>
          ) : null}
          {may(ctx.actor.role, 'jobs:change') ? (
            <section>
              <TitleBlock title="For the crew" />
              <ForCrewForm jobId={job.id} forCrew={forCrew} key={JSON.stringify(forCrew)} />
            </section>
          ) : null}
          {may(ctx.actor.role, 'customers:erase') && !job.isErased ? (
            <section>
              <TitleBlock title="The customer’s data" />
              <CustomerData customerId={job.customerId} />
            </section>
          ) : null}
        </div>
        <div className="flex min-w-0 flex-col gap-6">
          <section>
            <TitleBlock title="Rooms" meta={`${rooms.length} of ${job.roomCount}`} />
            <RoomList jobId={job.id} rooms={rooms} />
          </section>
          {photos.length > 0 ? (
            <section>
              <TitleBlock title="Photos" meta={photos.length} />
              <JobPhotos photos={photos} rooms={rooms} />
            </section>
          ) : null}
          <section>
            <TitleBlock title="Papers" meta={papers.length} />
            <JobFiles jobId={job.id} files={papers} mayAdd={may(ctx.actor.role, 'jobs:change')} />
          </section>
          <section>
            <TitleBlock title="Snags" meta={openWords(snags)} />
            <JobSnags
              jobId={job.id}
              snags={snags}
              rooms={rooms}
              mayChange={may(ctx.actor.role, 'snags:change')}
            />
          </section>
          {signOffs.length > 0 ? (
            <section>
              <TitleBlock title="Signed" />
              <SignOffList signOffs={signOffs} />
            </section>
          ) : null}
          <section>
            <TitleBlock title="What happened" />
            <JobStory story={job.story} />
          </section>
        </div>
      </div>
    </>
  );
}

function openWords(snags: { closedAt: string | null }[]): string {
  const open = snags.filter(({ closedAt }) => closedAt === null).length;
  return open === 0 ? 'none open' : `${open} open`;
}
