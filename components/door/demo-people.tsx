import { TitleBlock } from '@/components/ui/title-block';

export type DemoPerson = {
  name: string;
  /** What they do here: "Scheduler", "Measurer". */
  role: string;
  /** What they would do first: "books measures and installs". */
  does: string;
  email: string;
  password: string;
};

type DemoPeopleProps = {
  people: DemoPerson[];
  isBusy: boolean;
  onChoose: (person: { email: string; password: string }) => void;
};

/** The demo's shop, one tap a person. Nothing here is secret: the shop and its people are invented. */
export function DemoPeople({ people, isBusy, onChoose }: DemoPeopleProps) {
  return (
    <section>
      <TitleBlock title="The demo's people" meta="one tap signs in" />
      <ul>
        {people.map(({ name, role, does, email, password }) => (
          <li key={email} className="border-b border-rule">
            <button
              type="button"
              disabled={isBusy}
              onClick={() => onChoose({ email, password })}
              className="flex min-h-thumb w-full items-center justify-between gap-4 px-2 py-2 text-left hover:bg-tint"
            >
              <span>
                <span className="font-bold">{role}</span>
                <span className="block text-note text-graphite">
                  {name}, {does}
                </span>
              </span>
              <span aria-hidden="true" className="font-bold text-pine">
                ›
              </span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
