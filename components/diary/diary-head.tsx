import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { DiaryView } from './diary-calendar';

const views: { view: DiaryView; word: string; key: string }[] = [
  { view: 'dayGridMonth', word: 'month', key: 'M' },
  { view: 'timeGridWeek', word: 'week', key: 'W' },
  { view: 'timeGridDay', word: 'day', key: 'D' },
];

export function DiaryHead({
  title,
  view,
  onView,
  onEarlier,
  onToday,
  onLater,
}: {
  title: string;
  view: DiaryView;
  onView: (view: DiaryView) => void;
  onEarlier: () => void;
  onToday: () => void;
  onLater: () => void;
}) {
  return (
    <TitleBlock
      level={1}
      title={title || 'Diary'}
      meta={
        <div className="flex flex-wrap items-center gap-1">
          <Button look="plain" onClick={onEarlier} aria-label="Earlier" className="no-underline">
            ←
          </Button>
          <Button look="plain" onClick={onToday} keyName="T">
            today
          </Button>
          <Button look="plain" onClick={onLater} aria-label="Later" className="no-underline">
            →
          </Button>
          <fieldset className="ml-3 flex gap-1">
            <legend className="sr-only">View</legend>
            {views.map(({ view: each, word, key }) => (
              <Button
                key={each}
                look={each === view ? 'line' : 'plain'}
                aria-pressed={each === view}
                onClick={() => onView(each)}
                keyName={key}
              >
                {word}
              </Button>
            ))}
          </fieldset>
        </div>
      }
    />
  );
}
