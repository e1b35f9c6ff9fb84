import Link from 'next/link';
import { connection } from 'next/server';
import { ChainOfAJob } from '@/components/front/chain-of-a-job';
import { CornerForm } from '@/components/front/corner-form';
import { Promises } from '@/components/front/promises';
import { PlainPage } from '@/components/shell/plain-page';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';
import { env } from '@/server/base/env';

export default async function FrontPage() {
  await connection();
  const isDemo = env().demo;
  return (
    <PlainPage
      aside={
        <nav aria-label="Ways in" className="flex gap-5">
          <Link href={paths.check()} className="link">
            Checks
          </Link>
          <Link href={paths.signIn()} className="link">
            Sign in
          </Link>
        </nav>
      }
    >
      <div className="grid gap-x-12 gap-y-4 pb-8 lg:grid-cols-2 lg:items-end">
        <h1 className="text-reading font-bold tracking-tight">
          No room is square.
          <br />
          Build to it anyway.
        </h1>
        <div className="flex flex-col gap-4">
          <p className="max-w-prose text-lead">
            Setwell books site measures and installs for cabinet shops, proves the walls before the
            measurer leaves the room, and works out the fillers and scribes, so that what you build
            goes in the first time.
          </p>
          <p className="flex flex-wrap gap-2">
            {isDemo ? (
              <LinkButton href={paths.demo()}>The whole chain in three minutes</LinkButton>
            ) : (
              <LinkButton href={paths.signUp()}>Open a shop</LinkButton>
            )}
            <LinkButton look="line" href={paths.signIn()}>
              Sign in
            </LinkButton>
          </p>
        </div>
      </div>
      <div className="border border-ink bg-sheet px-4 py-4 md:px-6">
        <CornerForm />
      </div>
      <section className="pt-14">
        <TitleBlock title="One job, one chain" meta="first call to signature" className="mb-7" />
        <ChainOfAJob />
      </section>
      <section className="pt-14">
        <TitleBlock title="What it holds to" />
        <Promises />
      </section>
      <p className="pt-10 text-note text-graphite">
        Local codes and the maker's instructions come first.
      </p>
    </PlainPage>
  );
}
