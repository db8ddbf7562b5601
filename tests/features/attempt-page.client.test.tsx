import { screen, waitFor, within } from '@testing-library/react';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { whoAmI } from '../../shared/contracts/accounts.ts';
import { getAttempt, getDebrief, getEvents } from '../../shared/contracts/attempts.ts';
import { getOven } from '../../shared/contracts/ovens.ts';
import {
  attempt,
  debrief,
  events,
  id,
  layout,
  oven,
  signedInAs,
} from '../support/client-fixtures.ts';
import { fakeApi, type FakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const path = `/attempts/${id(101)}`;

const handedIn = (): FakeApi =>
  fakeApi()
    .on(whoAmI, { signedIn: signedInAs('trainee') })
    .on(getAttempt, { attempt: attempt() })
    .on(getDebrief, { debrief })
    .on(getEvents, { events: [...events] })
    .on(getOven, { definition: oven, layout });

const timeline = () => screen.findByRole('region', { name: 'Timeline' });

// The bench on its canvas has tests of its own; here it matters which moment it is given.
vi.mock('../../src/bench/replay/replay-panel.tsx', () => ({
  ReplayPanel: ({ at, onSeek }: { at: number; onSeek: (at: number) => void }) => (
    <button type="button" onClick={() => onSeek(at + 1)}>
      One event on from {at}
    </button>
  ),
}));

// Fetched when the page asks for them; here before the clock of a test runs.
beforeAll(async () => {
  await import('../../src/features/debrief/components/bench-record.tsx');
  await import('../../src/features/debrief/components/readings-table.tsx');
  await import('../../src/features/debrief/components/true-faults.tsx');
}, 60_000);

describe('the debrief', () => {
  it('leads with one sentence, the score and the six skills', async () => {
    handedIn();
    await renderApp(path);
    const outcome = await screen.findByRole('region', { name: 'Outcome' });
    expect(within(outcome).getByText(debrief.outcome)).toBeInTheDocument();
    expect(within(outcome).getByText('cause found')).toBeInTheDocument();
    expect(within(outcome).getByText('not worked safely')).toBeInTheDocument();
    const skills = screen.getByRole('region', { name: 'Six skills' });
    expect(
      within(skills)
        .getAllByRole('heading', { level: 3 })
        .map(({ textContent }) => textContent),
    ).toEqual(['make safe', 'isolate', 'measure', 'reason', 'repair and verify', 'record']);
    expect(within(skills).getByText('not judged')).toBeInTheDocument();
    expect(within(skills).getByText('−30')).toBeInTheDocument();
  });

  it('jumps from a mark to its moment and keeps the moment in the address', async () => {
    handedIn();
    const { user, address } = await renderApp(path);
    await timeline();
    await user.click(screen.getByRole('button', { name: /You discharged C1\.1/ }));
    await waitFor(() => expect(address()).toBe(`${path}?at=4`));
    expect(screen.getByRole('group', { name: 'Replay' })).toHaveFocus();
    const moment = within(await timeline()).getByRole('button', {
      name: /Discharge tip on C1\.1/i,
    });
    expect(moment).toHaveAttribute('aria-current', 'step');
    expect(moment).toHaveTextContent('00:44');
    expect(moment).toHaveTextContent('+20');
  });

  it('shows the moment of the replay in the timeline and leaves the focus where it is', async () => {
    handedIn();
    const { user, address } = await renderApp(`${path}?at=3`);
    await user.click(await screen.findByRole('button', { name: 'One event on from 3' }));
    const next = await screen.findByRole('button', { name: 'One event on from 4' });
    expect(next).toHaveFocus();
    expect(address()).toBe(`${path}?at=4`);
    expect(within(await timeline()).getByRole('button', { current: 'step' })).toHaveTextContent(
      'discharge tip on C1.1',
    );
  });

  it('makes one line of marks that say the same, with a button for each moment', async () => {
    handedIn();
    const { user, address } = await renderApp(path);
    await timeline();
    const skills = within(screen.getByRole('region', { name: 'Six skills' }));
    expect(skills.getByText('You waited until the reading stood.')).toBeInTheDocument();
    expect(skills.getByText('+30')).toBeInTheDocument();
    await user.click(
      skills.getByRole('button', { name: 'You waited until the reading stood. At 04:04' }),
    );
    await waitFor(() => expect(address()).toBe(`${path}?at=8`));
  });

  it('offers no jump for what was never done', async () => {
    handedIn();
    await renderApp(path);
    await timeline();
    expect(
      screen.getByText('You never proved the capacitor dead on DC volts.'),
    ).toBeInTheDocument();
    expect(
      screen.queryByRole('button', { name: /You never proved the capacitor/ }),
    ).not.toBeInTheDocument();
  });

  it('opens at the moment of the address', async () => {
    handedIn();
    await renderApp(`${path}?at=8`);
    const moment = within(await timeline()).getByRole('button', { current: 'step' });
    expect(moment).toHaveTextContent('D1.a–D1.k 0.4 Ω');
    expect(screen.getByRole('group', { name: 'Replay' })).toHaveFocus();
  });

  it('shows the moments that counted, and every event on request', async () => {
    handedIn();
    const { user } = await renderApp(path);
    const lines = () =>
      within(screen.getByRole('region', { name: 'Timeline' })).getAllByRole('button');
    await timeline();
    // Marks point at events 1, 4, 5, 7, 8 and 9.
    expect(lines()).toHaveLength(6);
    await user.click(screen.getByRole('checkbox', { name: /Show all 10 events/ }));
    expect(lines()).toHaveLength(10);
    expect(lines()[0]).toHaveTextContent('job begun');
  });

  it('adds what could not be seen, and marks what was taken back', async () => {
    const first = events[0];
    if (!first) throw new Error('no event');
    const step = (sequence: number, type: string, data: Record<string, unknown>) => ({
      ...first,
      sequence,
      type,
      data,
      benchMs: 1000 * sequence,
    });
    const run = {
      ordered: 60,
      seconds: 1.5,
      isDisplayLit: true,
      isLampLit: true,
      isFanTurning: true,
      isTurntableTurning: true,
      hum: 'loud',
      current: 31,
      microwavePower: 0,
      waterRise: 0,
      opened: ['F1'],
      charge: {},
    };
    handedIn().on(getEvents, {
      events: [
        first,
        step(1, 'OvenRun', run),
        step(2, 'CordPlugged', { isDisplayLit: true }),
        step(3, 'SteppedBack', { undone: 'CordPlugged', doneAtMs: 2000 }),
      ],
    });
    const { user } = await renderApp(path);
    const lines = () =>
      within(screen.getByRole('region', { name: 'Timeline' })).getAllByRole('button');
    await timeline();
    await user.click(screen.getByRole('checkbox', { name: /Show all 4 events/ }));
    expect(lines()[1]).toHaveTextContent(
      'run: display lit, lamp lit, a loud hum, water cold, over after 1.5 sUnseen then: F1 opened.',
    );
    expect(lines()[2]).toHaveTextContent('Taken back by a step back.');
  });

  it('names what was truly wrong', async () => {
    handedIn();
    await renderApp(path);
    const faults = await screen.findByRole('region', { name: 'What was truly wrong' });
    await waitFor(() => expect(faults).toHaveTextContent(/D1, .*diode: shorted/i));
  });

  it('sets the readings of the job sheet against the service data', async () => {
    handedIn();
    await renderApp(path);
    const table = await screen.findByRole('table', { name: 'Readings on the job sheet' });
    // Service data of the oven: high-voltage winding 80 to 120 Ω; the diode gives 20 to 50 MΩ forward.
    const winding = within(table).getByRole('row', { name: /T1\.HV – T1\.core/ });
    expect(winding).toHaveTextContent('94.8 Ω');
    expect(winding).toHaveTextContent('80 to 120 Ω');
    expect(within(winding).getByText('within')).toBeInTheDocument();
    const diode = within(table).getByRole('row', { name: /D1\.a – D1\.k/ });
    expect(within(diode).getByText('outside')).toBeInTheDocument();
  });

  it('offers the bench while the attempt is not handed in', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(getAttempt, { attempt: attempt({ status: 'on the bench', score: null }) });
    await renderApp(path);
    expect(await screen.findByRole('link', { name: 'Go on with your attempt' })).toHaveAttribute(
      'href',
      `/bench/${id(101)}`,
    );
  });

  it('offers no bench to whoever only reads', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('instructor') })
      .on(getAttempt, { attempt: attempt({ status: 'on the bench', score: null, isOwn: false }) });
    await renderApp(path);
    expect(await screen.findByText(/Tom Reyes has not handed in/)).toBeInTheDocument();
    expect(screen.queryByRole('link', { name: /Go on/ })).not.toBeInTheDocument();
  });

  it('asks a visitor to keep it', async () => {
    handedIn().on(whoAmI, { signedIn: null });
    await renderApp(path);
    expect(
      await screen.findByRole('link', { name: 'Create an account and keep it' }),
    ).toHaveAttribute('href', '/sign-up');
  });

  it('keeps the skills when the timeline fails', async () => {
    const api = handedIn().on(getEvents, 'no network');
    const { user } = await renderApp(path);
    expect(await screen.findByText('The timeline could not be loaded.')).toBeInTheDocument();
    expect(screen.getByRole('region', { name: 'Six skills' })).toBeInTheDocument();
    api.on(getEvents, { events: [...events] });
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await timeline()).toBeInTheDocument();
  });

  it('says so when nothing was written on the sheet', async () => {
    handedIn().on(getEvents, { events: events.slice(0, 3) });
    await renderApp(path);
    expect(await screen.findByText('No reading was written on the job sheet.')).toBeInTheDocument();
  });
});
