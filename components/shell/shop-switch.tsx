'use client';

import { useState } from 'react';
import { switchShop } from '@/components/door/auth-requests';
import { showToast } from '@/components/ui/toast-store';
import { paths } from '@/lib/paths';
import { problemOf } from './ask-server';

export type ShopChoice = { id: string; name: string };

/** The shop's name; a list to choose from for a person who belongs to more than one. */
export function ShopSwitch({ shop, shops }: { shop: ShopChoice; shops: ShopChoice[] }) {
  const [isSwitching, setIsSwitching] = useState(false);
  if (shops.length < 2) return <p className="font-medium text-balance">{shop.name}</p>;

  const goTo = async (shopId: string) => {
    setIsSwitching(true);
    try {
      await switchShop(shopId);
      // The door sends each role to where its day begins in that shop.
      window.location.assign(paths.signIn());
    } catch (caught) {
      setIsSwitching(false);
      showToast({ text: problemOf(caught).title, isProblem: true });
    }
  };
  return (
    <select
      aria-label="Shop"
      value={shop.id}
      disabled={isSwitching}
      onChange={(event) => goTo(event.target.value)}
      className="min-h-9 w-full rounded border border-rule bg-sheet px-1 font-medium"
    >
      {shops.map(({ id, name }) => (
        <option key={id} value={id}>
          {name}
        </option>
      ))}
    </select>
  );
}
