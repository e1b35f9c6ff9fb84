'use client';

import type { ChangeCrewInput } from '@/lib/contracts/crews';
import { dayNames } from './pattern-words';

type Members = NonNullable<ChangeCrewInput['members']>;

type MemberFieldsProps = {
  people: readonly { id: string; name: string }[];
  members: Members;
  onChange: (members: Members) => void;
};

const everyDay = [1, 2, 3, 4, 5, 6, 7];

/** Who goes, and on which days: somebody may go with another crew on the others. */
export function MemberFields({ people, members, onChange }: MemberFieldsProps) {
  const put = (personId: string, weekdays: number[]) => {
    const others = members.filter((member) => member.personId !== personId);
    if (weekdays.length === 0) return onChange(others);
    const isEvery = weekdays.length === everyDay.length;
    onChange([...others, { personId, weekdays: isEvery ? null : weekdays }]);
  };
  return (
    <ul>
      {people.map(({ id, name }) => {
        const member = members.find(({ personId }) => personId === id);
        const days = member ? (member.weekdays ?? everyDay) : [];
        return (
          <li key={id} className="flex flex-wrap items-center gap-x-4 border-b border-rule py-1">
            <label className="flex min-h-9 min-w-40 items-center gap-2.5">
              <input
                type="checkbox"
                className="size-5 accent-pine"
                checked={member !== undefined}
                onChange={(event) => put(id, event.target.checked ? everyDay : [])}
              />
              {name}
            </label>
            {member ? (
              <fieldset className="flex flex-wrap gap-x-3">
                <legend className="sr-only">Days on which {name} goes</legend>
                {everyDay.map((day) => (
                  <label key={day} className="flex min-h-9 items-center gap-1 text-note">
                    <input
                      type="checkbox"
                      className="size-4 accent-pine"
                      checked={days.includes(day)}
                      onChange={(event) =>
                        put(
                          id,
                          event.target.checked
                            ? [...days, day].sort()
                            : days.filter((one) => one !== day),
                        )
                      }
                    />
                    {dayNames[day - 1]}
                  </label>
                ))}
              </fieldset>
            ) : null}
          </li>
        );
      })}
    </ul>
  );
}
