import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { DiaryView, ShownView } from './diary-view';

const views: { view: DiaryView; word: string; key: string }[] = [
  { view: 'crews', word: 'crews', key: 'C' },
  { view: 'month', word: 'month', key: 'M' },
  { view: 'week', word: 'week', key: 'W' },
  { view: 'day', word: 'day', key: 'D' },
  { view: 'list', word: 'list', key: 'L' },
];

export function DiaryHead({
  title,
  shown,
  onShow,
  onEarlier,
  onToday,
  onLater,
}: {
  title: string;
  shown: ShownView;
  onShow: (change: Partial<ShownView>) => void;
  onEarlier: () => void;
  onToday: () => void;
  onLater: () => void;
}) {
  return (
    <TitleBlock
      level={1}
      title={title || 'Diary'}
      meta={
        <div className="flex flex-wrap items-center gap-1 print:hidden">
          <Button look="plain" onClick={onEarlier} aria-label="Earlier" className="no-underline">
            ←
          </Button>
          <Button look="plain" onClick={onToday} keyName="T">
            today
          </Button>
          <Button look="plain" onClick={onLater} aria-label="Later" className="no-underline">
            →
          </Button>
          <fieldset className="ml-2 flex gap-1">
            <legend className="sr-only">View</legend>
            {views.map(({ view, word, key }) => (
              <Button
                key={view}
                look={view === shown.view ? 'line' : 'plain'}
                aria-pressed={view === shown.view}
                onClick={() => onShow({ view })}
                keyName={key}
                className="px-2.5"
              >
                {word}
              </Button>
            ))}
          </fieldset>
          {shown.view === 'crews' ? <WeeksChoice shown={shown} onShow={onShow} /> : null}
          {shown.isListFolded ? (
            <Button
              look="plain"
              onClick={() => onShow({ isListFolded: false })}
              keyName="R"
              className="px-2.5 max-lg:hidden"
            >
              waiting list
            </Button>
          ) : null}
        </div>
      }
    />
  );
}

function WeeksChoice({
  shown,
  onShow,
}: {
  shown: ShownView;
  onShow: (change: Partial<ShownView>) => void;
}) {
  return (
    <select
      aria-label="Weeks shown"
      className="min-h-9 rounded border border-rule bg-sheet px-2 text-ink"
      value={shown.weeks}
      onChange={(event) => onShow({ weeks: Number(event.target.value) as ShownView['weeks'] })}
    >
      <option value={1}>1 week</option>
      <option value={2}>2 weeks</option>
      <option value={3}>3 weeks</option>
      <option value={4}>4 weeks</option>
    </select>
  );
}
