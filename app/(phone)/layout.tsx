import type { ReactNode } from 'react';
import { PhonePerson } from '@/components/phone/phone-person';
import { pageContext } from '@/server/base/page-context';

/** Every phone page sends what the phone keeps for the person who is signed in. */
export default async function PhoneLayout({ children }: { children: ReactNode }) {
  const { actor } = await pageContext('visits:read');
  return <PhonePerson personId={actor.personId}>{children}</PhonePerson>;
}
