import Link from 'next/link';
import { InviteForm } from '@/components/crews/invite-form';
import { LinkButton } from '@/components/ui/link-button';
import type { CrewsView } from '@/lib/contracts/crews';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { type StartView, type StartStep as Step, startSteps } from '@/lib/contracts/start';
import { paths } from '@/lib/paths';
import { CrewStep } from './crew-step';
import { HoursStep } from './hours-step';
import { StartStep } from './start-step';

const titles: Record<Step, string> = {
  hours: 'Say when you work',
  crew: 'Make a crew',
  job: 'Start the first job',
  visit: 'Book its site measure',
  yes: 'Wait for the yes',
  people: 'Invite your people, when you like',
};

type StartStepsProps = {
  start: StartView;
  settings: ShopSettings;
  crews: CrewsView;
  person: { personId: string; name: string };
};

/** From nothing to a confirmed visit. What comes next stands open, and most of it is done on this page. */
export function StartSteps({ start, settings, crews, person }: StartStepsProps) {
  const { done, customerPage } = start;
  // The last one stays open: it shows the link of whoever was invited, and there may be more to invite.
  const next = startSteps.find((step) => !done[step]) ?? 'people';
  const bodies: Record<Step, React.ReactNode> = {
    hours: <HoursStep settings={settings} places={crews.holidayPlaces} />,
    crew: <CrewStep crews={crews.crews} person={person} />,
    job: (
      <>
        <p>Who called, where, and what they want made. Tick that they may be texted or e-mailed.</p>
        <LinkButton href={paths.newJob()}>Start a job</LinkButton>
        <Link href={paths.importJobs()} className="link">
          Or bring in a list of customers and jobs, as CSV
        </Link>
      </>
    ),
    visit: (
      <>
        <p>
          The job stands in the list beside the diary. “Times” finds times that work, best first;
          “Book it” takes one, and the customer is told.
        </p>
        <LinkButton href={paths.diary()}>To the diary</LinkButton>
      </>
    ),
    yes: (
      <>
        <p>
          The customer has a link by text or e-mail, and says yes there without an account. You see
          it in the diary and here. From {settings.booking.quietFrom} to{' '}
          {settings.booking.quietUntil} nothing goes out: it waits for the morning.
        </p>
        {customerPage ? (
          <a href={customerPage} target="_blank" rel="noreferrer" className="link">
            See the page that they have
          </a>
        ) : null}
        <Link href={paths.messages()} className="link">
          What was sent, and whether it arrived
        </Link>
      </>
    ),
    people: <InviteForm />,
  };
  return (
    <ol className="border-t border-ink">
      {startSteps.map((step, place) => (
        <StartStep
          key={step}
          number={place + 1}
          title={titles[step]}
          isDone={done[step]}
          isNext={step === next}
        >
          {bodies[step]}
        </StartStep>
      ))}
    </ol>
  );
}
