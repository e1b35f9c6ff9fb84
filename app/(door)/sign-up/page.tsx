import type { Metadata } from 'next';
import Link from 'next/link';
import { SignUpForm } from '@/components/door/sign-up-form';
import { PlainPage } from '@/components/shell/plain-page';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';

export const metadata: Metadata = { title: 'Open a new shop' };

export default function SignUpPage() {
  return (
    <PlainPage width="form">
      <TitleBlock
        level={1}
        title="Open a new shop"
        meta={
          <Link href={paths.signIn()} className="link">
            Sign in
          </Link>
        }
        className="mb-6"
      />
      <SignUpForm />
    </PlainPage>
  );
}
