'use client';

import { useState } from 'react';
import { switchShop } from '@/components/door/auth-requests';
import { showToast } from '@/components/ui/toast-store';
import { paths } from '@/lib/paths';
import { problemOf } from './ask-server';

export type ShopChoice = { id: string; name: string };

/** The shop's name, and the way to the others of a person who belongs to more than one. */
export function ShopSwitch({ shop, shops }: { shop: ShopChoice; shops: ShopChoice[] }) {
  const [isSwitching, setIsSwitching] = useState(false);

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
    <div>
      <p className="font-medium text-balance">{shop.name}</p>
      {shops
        .filter(({ id }) => id !== shop.id)
        .map(({ id, name }) => (
          <button
            key={id}
            type="button"
            disabled={isSwitching}
            onClick={() => goTo(id)}
            className="link min-h-7 text-left text-note max-md:min-h-key"
          >
            to {name}
          </button>
        ))}
    </div>
  );
}
