import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { SignInForm } from '@/components/door/sign-in-form';
import { PlainPage } from '@/components/shell/plain-page';
import { TitleBlock } from '@/components/ui/title-block';
import { paths, safeNext } from '@/lib/paths';
import { homeOf, visitorContext } from '@/server/base/page-context';
import { listDemoPeople } from '@/server/people/list-demo-people';

export const metadata: Metadata = { title: 'Sign in' };

type SignInPageProps = { searchParams: Promise<{ next?: string | string[] }> };

export default async function SignInPage({ searchParams }: SignInPageProps) {
  const { next: given } = await searchParams;
  const next = typeof given === 'string' ? given : undefined;
  const ctx = await visitorContext();
  if (ctx) redirect(safeNext(next, homeOf(ctx)));
  return (
    <PlainPage width="form">
      <TitleBlock
        level={1}
        title="Sign in"
        meta={
          <Link href={paths.signUp()} className="link">
            Open a new shop
          </Link>
        }
        className="mb-6"
      />
      <SignInForm next={next} demoPeople={await listDemoPeople()} />
    </PlainPage>
  );
}
