import type { Metadata } from 'next';
import type { ReactNode } from 'react';
import { PhonePerson } from '@/components/phone/phone-person';
import { may } from '@/lib/permissions';
import { pageContext } from '@/server/base/page-context';

/** On the home screen it is a program of its own. */
export const metadata: Metadata = {
  appleWebApp: { capable: true, title: 'Setwell', statusBarStyle: 'default' },
};

/** Every phone page sends what the phone keeps for the person who is signed in. */
export default async function PhoneLayout({ children }: { children: ReactNode }) {
  const { actor, shop } = await pageContext('visits:read');
  const { personId, name: personName, role } = actor;
  return (
    <PhonePerson
      holder={{
        personId,
        personName,
        shopName: shop.name,
        mayReport: may(role, 'visits:report'),
        mayMeasure: may(role, 'walls:measure'),
        region: shop.region,
        zone: shop.zone,
      }}
    >
      {children}
    </PhonePerson>
  );
}
