'use client';

import dynamic from 'next/dynamic';
import { Skeleton } from '@/components/ui/skeleton';

/** The map reaches for the window when it is loaded, so it is fetched in the browser alone, and when it is shown. */
export const DayMap = dynamic(
  () => import('./leaflet-day-map').then((made) => made.LeafletDayMap),
  {
    ssr: false,
    loading: () => <Skeleton className="h-full min-h-80 w-full" />,
  },
);
