import { paths } from '@/lib/paths';
import { may, type Permission, type Role } from '@/lib/permissions';

/** The office's pages in the order of the day, the letter that goes there after G, and who may see each. */
export const officePages = [
  { name: 'diary', word: 'Diary', path: paths.diary(), letter: 'D', permission: 'visits:read' },
  { name: 'days', word: 'Days', path: paths.days(), letter: 'Y', permission: 'visits:read' },
  { name: 'jobs', word: 'Jobs', path: paths.jobs(), letter: 'J', permission: 'jobs:read' },
  { name: 'bench', word: 'Bench', path: paths.bench(), letter: 'B', permission: 'sheets:read' },
  { name: 'snags', word: 'Snags', path: paths.snags(), letter: 'S', permission: 'jobs:read' },
  {
    name: 'messages',
    word: 'Messages',
    path: paths.messages(),
    letter: 'M',
    permission: 'messages:read',
  },
  {
    name: 'crews',
    word: 'Crews & people',
    path: paths.crews(),
    letter: 'C',
    permission: 'people:read',
  },
  {
    name: 'numbers',
    word: 'Numbers',
    path: paths.numbers(),
    letter: 'N',
    permission: 'numbers:read',
  },
  { name: 'rules', word: 'Shop rules', path: paths.rules(), letter: 'R', permission: 'shop:read' },
  { name: 'start', word: 'Start', path: paths.start(), letter: 'A', permission: 'shop:change' },
  { name: 'today', word: 'Today', path: paths.today(), letter: 'T', permission: 'visits:report' },
] as const satisfies readonly {
  name: string;
  word: string;
  path: string;
  letter: string;
  permission: Permission;
}[];

export type OfficePage = (typeof officePages)[number];

export function officePagesFor(role: Role): OfficePage[] {
  return officePages.filter((page) => may(role, page.permission));
}

/** The page that an address belongs to: /jobs/12/rooms/3 is under Jobs. */
export function currentOfficePage(pathname: string): OfficePage | null {
  return (
    officePages.find((page) => pathname === page.path || pathname.startsWith(`${page.path}/`)) ??
    null
  );
}
