import Link from 'next/link';
import { paths } from '@/lib/paths';
import { Mark } from './mark';

export function Wordmark({ href = paths.front() }: { href?: string }) {
  return (
    <Link
      href={href}
      className="inline-flex items-center gap-1.5 text-lead font-bold tracking-tight"
    >
      <Mark />
      Setwell
    </Link>
  );
}
