'use client';

import { useQuery } from '@tanstack/react-query';
import type { ToAnswerView } from '@/lib/contracts/messages';
import { apiPaths } from '@/lib/paths';
import { askServer } from './ask-server';

/** Beside "Messages", wherever one is: how many customers wait for the office. */
export function ToAnswer() {
  const { data } = useQuery({
    queryKey: ['messages', 'to-answer'],
    queryFn: () => askServer<ToAnswerView>(apiPaths.schedulerItems()),
  });
  if (!data || data.toAnswer === 0) return null;
  return (
    <span className="font-bold text-chalk">
      {data.toAnswer}
      <span className="sr-only"> to answer</span>
    </span>
  );
}
