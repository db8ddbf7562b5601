import { act, screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import {
  appendEvents,
  getAttempt,
  getDebrief,
  getEvents,
  takeOver,
} from '../../../shared/contracts/attempts.ts';
import { whoAmI } from '../../../shared/contracts/accounts.ts';
import type { RecordedEvent } from '../../../shared/bench/event.ts';
import { getOven } from '../../../shared/contracts/ovens.ts';
import { attempt, contents, debrief, layout, oven } from '../../support/client-fixtures.ts';
import { fakeApi, type FakeApi } from '../../support/fake-api.ts';
import { renderApp } from '../../support/render-app.tsx';

const began: RecordedEvent = {
  sequence: 0,
  type: 'AttemptBegan',
  version: 1,
  data: { engine: 1, seed: 417, charge: {}, opened: [], isDisplayLit: true },
  benchMs: 0,
  recordedAt: '2026-01-05T08:00:00.000Z',
};
const onBench = attempt({
  status: 'on the bench',
  handedInAt: null,
  score: null,
  outcome: null,
  content: { ...contents[0], lastRunSecondsAgo: null },
});
const path = `/bench/${onBench.id}`;

/** A server that stores what it is sent. */
function server(): { api: FakeApi; record: RecordedEvent[] } {
  const record: RecordedEvent[] = [began];
  const api = fakeApi()
    .on(getAttempt, { attempt: onBench })
    .on(getOven, { definition: oven, layout })
    .on(getEvents, () => ({ events: record }))
    .on(takeOver, () => ({ epoch: 2, next: record.length }))
    .on(appendEvents, ({ body }) => {
      for (const event of body.events)
        record.push({ ...event, sequence: record.length, recordedAt: began.recordedAt });
      return { next: record.length };
    });
  return { api, record };
}

const open = async () => {
  const app = await renderApp(path);
  await screen.findByRole('main', { name: 'Bench' });
  return app;
};

describe('the bench page', () => {
  it('opens where the record stands and sends what is done', async () => {
    const { api, record } = server();
    const { user } = await open();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(onBench.title);
    expect(screen.getByRole('region', { name: 'Job ticket' })).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Open the door' }));
    await screen.findByText(/^saved at \d\d:\d\d$/);
    await waitFor(() =>
      expect(record.map(({ type }) => type)).toEqual(['AttemptBegan', 'DoorOpened']),
    );
    expect(api.callsOf(appendEvents)[0]?.body).toMatchObject({ epoch: 2, from: 1 });
    const bench = screen.getByRole('list', { name: 'State of the bench' });
    expect(within(bench).getByText('door open')).toBeInTheDocument();
  });

  it('goes on after it was closed', async () => {
    const { record } = server();
    record.push({ ...began, sequence: 1, type: 'DoorOpened', data: {}, benchMs: 65_000 });
    await open();
    const bench = screen.getByRole('list', { name: 'State of the bench' });
    expect(within(bench).getByText('door open')).toBeInTheDocument();
    expect(screen.getByRole('timer', { name: 'Bench time' })).toHaveTextContent('01:05');
  });

  it('says that steps are not saved while the server is away, and when they are', async () => {
    const { api, record } = server();
    let isAway = true;
    api.on(appendEvents, ({ body }) => {
      if (isAway) return 'no network';
      record.push(...body.events.map((event, i) => ({ ...began, ...event, sequence: 1 + i })));
      return { next: record.length };
    });
    const { user } = await open();
    await user.click(screen.getByRole('button', { name: 'Open the door' }));
    await screen.findByText(/not saved: 1 step kept/);
    expect(screen.getByRole('button', { name: 'Close the door' })).toBeInTheDocument();
    isAway = false;
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    await screen.findByText(/^saved at/);
    expect(record).toHaveLength(2);
  });

  it('only reads when another writer has taken over, and takes over again when it is told to', async () => {
    const { api } = server();
    api.on(appendEvents, {
      status: 409,
      code: 'another-writer',
      detail: 'Another tab records this attempt now.',
    });
    const { user } = await open();
    await user.click(screen.getByRole('button', { name: 'Open the door' }));
    await screen.findByText(/Another tab records this attempt now/);
    expect(screen.getByText('read only')).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Continue here' }));
    await waitFor(() => expect(api.callsOf(takeOver)).toHaveLength(2));
  });

  it('says plainly when a step is refused, keeps it, and goes on when it is set aside', async () => {
    const { api } = server();
    api.on(appendEvents, {
      status: 422,
      code: 'cannot-have-happened',
      detail: 'The door is open already.',
    });
    const { user } = await open();
    await user.click(screen.getByRole('button', { name: 'Open the door' }));
    await screen.findByText(/The record does not take what you did here last/);
    await user.click(screen.getByRole('button', { name: 'Close the door' }));
    expect(screen.getByRole('button', { name: 'Close the door' })).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Set them aside and go on' }));
    await screen.findByRole('button', { name: 'Open the door' });
  });

  it('hands in, stores it, and goes to the debrief', async () => {
    const { api, record } = server();
    api.on(whoAmI, { status: 401, code: 'not-signed-in', detail: 'Sign in first.' });
    api.on(getDebrief, { debrief });
    const { user, address } = await open();
    await user.selectOptions(screen.getByLabelText('Verdict on High-voltage diode D1'), 'faulty');
    await user.click(screen.getByRole('button', { name: /^Hand in/ }));
    const dialog = await screen.findByRole('alertdialog');
    await user.click(within(dialog).getByRole('button', { name: 'Hand in' }));
    await waitFor(() => expect(address()).toBe(`/attempts/${onBench.id}`));
    expect(record.at(-1)?.type).toBe('HandedIn');
  });

  it('leads to the debrief when the attempt is handed in already', async () => {
    const { api } = server();
    api.on(whoAmI, { status: 401, code: 'not-signed-in', detail: 'Sign in first.' });
    api.on(getDebrief, { debrief });
    api.on(getAttempt, { attempt: attempt({ id: onBench.id }) });
    const { address } = await renderApp(path);
    await waitFor(() => expect(address()).toBe(`/attempts/${onBench.id}`));
    expect(api.callsOf(takeOver)).toEqual([]);
  });

  it('says when the attempt cannot be loaded, and tries again', async () => {
    const { api } = server();
    api.on(getAttempt, 'no network');
    const { user } = await renderApp(path);
    await screen.findByText('This attempt could not be loaded.');
    api.on(getAttempt, { attempt: onBench });
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    await screen.findByRole('main', { name: 'Bench' });
  });

  it('tells of a hazard on the mat and in the log', async () => {
    const { record } = server();
    record.push(
      { ...began, sequence: 1, type: 'CordPulled', data: {}, benchMs: 10 },
      { ...began, sequence: 2, type: 'CoverRemoved', data: {}, benchMs: 20 },
    );
    const { user } = await open();
    await user.click(screen.getByRole('button', { name: 'Put the cord in' }));
    await screen.findByText('Mains within reach');
    await act(() => user.click(screen.getByRole('button', { name: 'Go on' })));
    expect(
      within(screen.getByRole('list', { name: 'Bench log' })).getByText(/mains within reach/),
    ).toBeInTheDocument();
  });
});
