import type { ReactNode } from 'react';
import { Toaster } from '@/components/ui/toaster';
import { may, type Role, roleWords } from '@/lib/permissions';
import { CarriersNote } from './carriers-note';
import { ListButtons } from './list-buttons';
import { OfficeKeys } from './office-keys';
import { OfficeLinks } from './office-links';
import { OfficeMenu } from './office-menu';
import { officePagesFor } from './office-pages';
import { type ShopChoice, ShopSwitch } from './shop-switch';
import { SignOutButton } from './sign-out-button';
import { ThemeSwitch } from './theme-switch';
import { Wordmark } from './wordmark';

type OfficeShellProps = {
  shop: ShopChoice;
  /** All shops of this person. */
  shops?: ShopChoice[];
  person: { name: string; role: Role };
  /** What nobody carries to customers yet. */
  carriersMissing?: readonly string[];
  /** No visit of this shop was confirmed yet: the way there stands first. */
  isStarting?: boolean;
  children: ReactNode;
};

/** The office's margin with its pages, and the sheet beside it. Wants the query client around it. */
export function OfficeShell({
  shop,
  shops = [],
  person,
  carriersMissing = [],
  isStarting = false,
  children,
}: OfficeShellProps) {
  const pages = officePagesFor(person.role);
  const shown = pages.filter(({ name }) => name !== 'start');
  const start = isStarting ? pages.filter(({ name }) => name === 'start') : [];
  const links = <OfficeLinks pages={[...start, ...shown]} />;
  const foot = (
    <div className="flex flex-col gap-2 pr-3 max-md:pr-0">
      <ShopSwitch shop={shop} shops={shops} />
      <p className="text-note text-graphite">
        {person.name}, {roleWords[person.role].toLowerCase()}
      </p>
      <ThemeSwitch />
      <SignOutButton />
    </div>
  );
  return (
    <div className="min-h-dvh md:grid md:grid-cols-[10.5rem_minmax(0,1fr)] print:block">
      <a href="#main" className="skip-link rounded border border-pine bg-sheet px-3 py-2 font-bold">
        To the content
      </a>
      <OfficeMenu>
        <ListButtons />
        <nav aria-label="Pages">{links}</nav>
        <div className="mt-4 border-t border-rule pt-3">{foot}</div>
      </OfficeMenu>
      <header className="sticky top-0 flex h-dvh flex-col gap-6 overflow-y-auto border-r border-rule py-5 pl-5 max-md:hidden print:hidden">
        <Wordmark />
        <nav aria-label="Pages" className="-mr-px">
          {links}
        </nav>
        <div className="pr-3">
          <ListButtons />
        </div>
        <div className="mt-auto">{foot}</div>
      </header>
      <main id="main" tabIndex={-1} className="min-w-0 px-4 py-4 outline-none md:px-6">
        {may(person.role, 'messages:read') ? <CarriersNote missing={carriersMissing} /> : null}
        {children}
      </main>
      <OfficeKeys role={person.role} />
      <Toaster />
    </div>
  );
}
