import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { askServer } from '@/components/shell/ask-server';
import type {
  AddDaysOffInput,
  ChangeClosedDaysInput,
  ChangeCrewInput,
  CrewChange,
  CrewsView,
} from '@/lib/contracts/crews';
import type { FeedView, MakeFeedInput } from '@/lib/contracts/feeds';
import { apiPaths } from '@/lib/paths';

/** The first part is what live changes are told under. */
const crewsKey = ['crews'] as const;

const settingsQuery = queryOptions({
  queryKey: [...crewsKey, 'settings'],
  queryFn: ({ signal }) => askServer<CrewsView>(apiPaths.crewSettings(), { signal }),
});

const feedsQuery = queryOptions({
  queryKey: [...crewsKey, 'feeds'],
  queryFn: ({ signal }) => askServer<FeedView[]>(apiPaths.feeds(), { signal }),
});

export const useCrews = (initialData: CrewsView) =>
  useQuery({ ...settingsQuery, initialData }).data;
export const useFeeds = (initialData: FeedView[]) => useQuery({ ...feedsQuery, initialData }).data;

/** Everything on the screen hangs together: a day off moves people, a crew's day moves what is outside. */
export function useRefetchCrews(): () => Promise<void> {
  const client = useQueryClient();
  return () => client.invalidateQueries({ queryKey: crewsKey });
}

export const changeCrew = ({ crewId, ...body }: ChangeCrewInput) =>
  askServer<CrewChange>(apiPaths.crew(crewId), { method: 'PATCH', body });
export const addDaysOff = (body: AddDaysOffInput) =>
  askServer<CrewChange>(apiPaths.daysOff(), { body });
export const removeDaysOff = (daysOffId: string) =>
  askServer(apiPaths.dayOff(daysOffId), { method: 'DELETE' });
export const changeClosedDays = (body: ChangeClosedDaysInput) =>
  askServer<CrewChange>(apiPaths.closedDays(), { method: 'PATCH', body });
export const makeFeed = (body: MakeFeedInput) =>
  askServer<{ feedId: string; address: string }>(apiPaths.feeds(), { body });
export const revokeFeed = (feedId: string) =>
  askServer(apiPaths.feeds(), { method: 'DELETE', body: { feedId } });
