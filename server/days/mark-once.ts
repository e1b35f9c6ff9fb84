import { Refusal } from '@/server/base/problem-response';

/** The row that a phone's id names is there already: the same one is fine, another's is refused. */
export function mustBeOwnRow(known: { visitId: string } | undefined, visitId: string): void {
  if (known?.visitId === visitId) return;
  throw new Refusal({
    status: 409,
    code: 'id-taken',
    message: 'Something else has this id already. It was not changed; tap it again.',
  });
}
