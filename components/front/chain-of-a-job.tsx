const steps = [
  {
    title: 'Book the measure',
    words:
      'A waiting list that says from when and why; no crew booked twice. The customer says yes with one tap.',
  },
  {
    title: 'Prove the walls',
    words:
      'Lengths at three heights, corners, plumb, floor. What disagrees is named before anybody leaves the room.',
  },
  {
    title: 'Work out the fit',
    words: 'Clear opening, fillers with their tapers, scribes, kick heights: each with its ±.',
  },
  {
    title: 'Release the sheet',
    words: 'A lettered revision, frozen. An old sheet says so in red.',
  },
  {
    title: 'Book the install',
    words: 'When the cabinets are ready, the floor is down and the customer has said yes.',
  },
  {
    title: 'Set the cabinets',
    words:
      'The day on the phone: the stops, the way in, on my way, arrived, done; the customer and the office see it.',
  },
];

/** The whole job as a chain of dimensions: each step runs from tick to tick. */
export function ChainOfAJob() {
  return (
    <ol className="grid gap-y-6 max-md:border-l max-md:border-graphite md:grid-cols-3 xl:grid-cols-6">
      {steps.map((step, at) => (
        <li
          key={step.title}
          className="relative max-md:pl-5 md:border-t md:border-graphite md:pt-4 md:pr-5"
        >
          <Tick className="absolute top-[0.35em] -left-2 md:-top-2" />
          <p className="text-note text-graphite">{at + 1}</p>
          <h3 className="font-bold">{step.title}</h3>
          <p>{step.words}</p>
        </li>
      ))}
    </ol>
  );
}

function Tick({ className }: { className: string }) {
  return (
    <svg viewBox="0 0 16 16" width="16" height="16" aria-hidden="true" className={className}>
      <path d="M3 13 13 3" className="stroke-ink" strokeWidth="1.6" />
    </svg>
  );
}
