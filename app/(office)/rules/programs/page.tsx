import type { Metadata } from 'next';
import { KeysPart } from '@/components/programs/keys-part';
import { WebhooksPart } from '@/components/programs/webhooks-part';
import { TitleBlock } from '@/components/ui/title-block';
import { apiPaths } from '@/lib/paths';
import { pageContext } from '@/server/base/page-context';
import { listPrograms } from '@/server/programs/list-programs';

export const metadata: Metadata = { title: 'Other programs' };

export default async function ProgramsPage() {
  const ctx = await pageContext('programs:change');
  const { keys, webhooks } = await listPrograms(ctx);
  return (
    <>
      <TitleBlock
        level={1}
        title="Other programs"
        meta={
          <a className="link" href={apiPaths.openInterface()}>
            How they ask (OpenAPI)
          </a>
        }
      />
      <div className="mt-4 grid gap-x-10 gap-y-6 xl:grid-cols-2">
        <KeysPart keys={keys} />
        <WebhooksPart webhooks={webhooks} />
      </div>
    </>
  );
}
