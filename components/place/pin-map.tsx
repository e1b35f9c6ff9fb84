'use client';

import dynamic from 'next/dynamic';
import { Skeleton } from '@/components/ui/skeleton';

/** The map reaches for the window when it is loaded, so it is fetched in the browser alone, when it is opened. */
export const PinMap = dynamic(
  () => import('./leaflet-pin-map').then((made) => made.LeafletPinMap),
  {
    ssr: false,
    loading: () => <Skeleton className="h-80 w-full" />,
  },
);
