import { describe, expect, it } from 'vitest';
import type { CrewSnag, SnagView } from '@/lib/contracts/snags';
import { snagsToMend } from '@/lib/days/snags-to-mend';

const snag = (id: string, more: Partial<SnagView> = {}): SnagView => ({
  id,
  jobId: 'kitchen',
  jobNumber: 1,
  customerName: '',
  kind: 'fault',
  roomId: null,
  roomName: null,
  unitId: null,
  place: '',
  words: id,
  mender: 'crew',
  dueOn: null,
  dueWords: null,
  isLate: false,
  photoIds: [],
  foundBy: 'Ana',
  foundAt: '2027-03-01T08:00:00Z',
  foundWords: '',
  isAfterSignOff: false,
  benchSays: '',
  benchReadyOn: null,
  closedAt: null,
  closedWords: '',
  closedPhotoIds: [],
  closedBy: null,
  ...more,
});
const place = {
  visitId: 'today',
  customerName: 'Fenn',
  street: '1 Reed Lane',
  town: '',
  nextOn: null,
};
const told = (id: string, more: Partial<SnagView> = {}): CrewSnag => ({
  ...snag(id, more),
  ...place,
});
const stop = (...snags: SnagView[]) => ({ ...place, jobId: 'kitchen', snags });
const idsOf = (input: Partial<Parameters<typeof snagsToMend>[0]>) =>
  snagsToMend({ told: [], stops: [], closedIds: [], today: '2027-03-02', ...input }).map(
    ({ id }) => id,
  );

describe('what a crew has to mend, as its phone knows it', () => {
  it('stands by due date, the undated last and the older first', () => {
    const list = [
      told('undated'),
      told('friday', { dueOn: '2027-03-05' }),
      told('older', { dueOn: '2027-03-05', foundAt: '2027-02-01T08:00:00Z' }),
      told('late', { dueOn: '2027-03-01' }),
    ];
    expect(idsOf({ told: list })).toEqual(['late', 'older', 'friday', 'undated']);
  });

  it('is late by the phone’s own day, not by the day on which it was fetched', () => {
    const [found] = snagsToMend({
      told: [told('a', { dueOn: '2027-03-01' })],
      stops: [],
      closedIds: [],
      today: '2027-03-02',
    });
    expect(found?.isLate).toBe(true);
  });

  it('loses what was closed here, sent or not, and gains what was found here', () => {
    const here = stop(
      snag('closed', { closedAt: '2027-03-02T09:00:00Z' }),
      snag('found'),
      snag('of the bench', { mender: 'bench' }),
    );
    const input = { told: [told('closed'), told('tapped'), told('stays')], stops: [here] };
    expect(idsOf({ ...input, closedIds: ['tapped'] })).toEqual(['found', 'stays']);
  });

  it('is once in the list though two visits of the job are kept', () => {
    expect(idsOf({ stops: [stop(snag('a')), stop(snag('a'))] })).toEqual(['a']);
  });

  it('knows whose it is and where, though it was found where nobody else has been told', () => {
    const [found] = snagsToMend({
      told: [],
      stops: [stop(snag('a'))],
      closedIds: [],
      today: '2027-03-02',
    });
    expect(found).toMatchObject({ customerName: 'Fenn', street: '1 Reed Lane', visitId: 'today' });
  });
});
