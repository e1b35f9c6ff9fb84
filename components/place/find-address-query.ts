import { askServer } from '@/components/shell/ask-server';
import type { FindAddressInput, FoundAddress } from '@/lib/contracts/travel';
import { apiPaths } from '@/lib/paths';

export const findAddress = (asked: FindAddressInput) =>
  askServer<FoundAddress>(`${apiPaths.geocode()}?${new URLSearchParams(asked)}`);
