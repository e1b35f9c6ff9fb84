'use client';

import { useRouter } from 'next/navigation';
import { useCrew } from '@/components/day/crew-language';
import { Button } from '@/components/ui/button';
import { paths } from '@/lib/paths';
import { newId } from './new-id';

/** Begins a room of the job: its id is made here, so that it can be drawn before the office knows it. */
export function AddRoom({ jobId, isFirst }: { jobId: string; isFirst: boolean }) {
  const router = useRouter();
  const { words } = useCrew();
  return (
    <Button
      size="thumb"
      look={isFirst ? 'fill' : 'plain'}
      onClick={() => router.push(paths.newWalls(newId(), jobId))}
    >
      {isFirst ? words.firstRoom : words.addRoom}
    </Button>
  );
}
