const steps = [
  ['Make safe', 'Cord out, cover off, capacitor discharged through a resistor and proved dead.'],
  ['Look', 'Burnt tabs, a swollen can, carbon, a lead off, a fuse of the wrong rating.'],
  ['Isolate', 'Lift the leads of the part under test, or its neighbours answer for it.'],
  [
    'Measure',
    'Pick a function and range, put the probes on two terminals, let the reading settle.',
  ],
  ['Reason', 'What still fits all the readings? A blown fuse is a result: what blew it?'],
  ['Repair and verify', 'Replace the part, refit every lead, cover on, water test.'],
  ['Hand in', 'Cause, evidence and report go on the job sheet. The debrief marks six skills.'],
] as const;

export const WhatYouDo = () => (
  <section aria-labelledby="what-you-do" className="grid gap-4">
    <h2 id="what-you-do" className="text-xl font-bold">
      What you do on the bench
    </h2>
    <ol className="grid gap-x-10 gap-y-3 md:grid-flow-col md:grid-cols-2 md:grid-rows-4">
      {steps.map(([name, what], index) => (
        <li key={name} className="grid grid-cols-[28px_1fr] gap-x-2">
          <span aria-hidden className="pt-px font-mono text-sm font-semibold text-ink-2">
            {index + 1}
          </span>
          <p>
            <strong className="font-bold">{name}.</strong> {what}
          </p>
        </li>
      ))}
    </ol>
  </section>
);
