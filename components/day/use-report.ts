'use client';

import { useState } from 'react';
import { usePersonId } from '@/components/phone/phone-person';
import { keepWork } from '@/components/phone/queue-store';
import type { VisitTap } from '@/components/phone/visit-report';
import type { TodayVisit } from '@/lib/contracts/visits';
import { useVisitHere } from './use-visit-here';

/** How a visit stands with what was tapped here, and telling what comes next; without a signal it is told later. */
export function useReport(visit: TodayVisit) {
  const personId = usePersonId();
  const { status } = useVisitHere(visit);
  const [isFailed, setIsFailed] = useState(false);
  const report = async (what: VisitTap, lateMinutes?: number): Promise<boolean> => {
    try {
      const at = new Date().toISOString();
      const told = { visitId: visit.id, what, at, lateMinutes };
      await keepWork(personId, [{ kind: 'report', report: told }]);
      setIsFailed(false);
      return true;
    } catch {
      setIsFailed(true);
      return false;
    }
  };
  return { status, report, isFailed };
}
