'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type { AcceptedSlip, AcceptSlipInput, SlipInput, SlipPreview } from '@/lib/contracts/slips';
import { apiPaths } from '@/lib/paths';

export const useSlipPreview = () =>
  useMutation({
    mutationFn: (input: SlipInput) =>
      askServer<SlipPreview>(apiPaths.slipPreview(), { body: input }),
  });

export function useAcceptSlip() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (input: AcceptSlipInput) =>
      askServer<AcceptedSlip>(apiPaths.acceptSlip(), { body: input }),
    onSettled: () => client.invalidateQueries(),
  });
}
