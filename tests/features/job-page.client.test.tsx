import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { whoAmI } from '../../shared/contracts/accounts.ts';
import { listOwnAttempts, startAttempt, startVisit } from '../../shared/contracts/attempts.ts';
import { getJob } from '../../shared/contracts/scenarios.ts';
import { attempt, id, jobs, signedInAs, summary } from '../support/client-fixtures.ts';
import { fakeApi, type FakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const [job] = jobs;
const path = `/jobs/${job.scenario}`;
const open = { status: 'on the bench', score: null, handedInAt: null, outcome: null } as const;

const trainee = (): FakeApi =>
  fakeApi()
    .on(whoAmI, { signedIn: signedInAs('trainee') })
    .on(getJob, { job });

describe('a job', () => {
  it('shows the ticket, the conditions and the cautions', async () => {
    trainee().on(listOwnAttempts, { attempts: [] });
    await renderApp(path);
    const ticket = await screen.findByRole('region', { name: 'Job ticket' });
    for (const text of [
      job.ticket.complaint,
      job.ticket.seenAtSite,
      job.ticket.age,
      'Larkfield LC-28',
    ])
      expect(within(ticket).getByText(text)).toBeInTheDocument();
    expect(screen.getByText(/Hazards are explained as they happen/)).toBeInTheDocument();
    expect(
      within(screen.getByRole('region', { name: 'Cautions' })).getByText(/kill with the plug out/),
    ).toBeInTheDocument();
    expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent(job.title);
  });

  it('starts an attempt and goes to the bench', async () => {
    const api = trainee()
      .on(listOwnAttempts, { attempts: [] })
      .on(startAttempt, { attempt: attempt({ ...open, id: id(142) }) });
    const { user, address } = await renderApp(path);
    await screen.findByText(/None yet/);
    await user.click(screen.getByRole('button', { name: 'Start on the bench' }));
    await waitFor(() => expect(address()).toBe(`/bench/${id(142)}`));
    expect(api.callsOf(startAttempt)[0]?.body).toEqual({ scenario: job.scenario });
  });

  it('goes on with the attempt that stands on the bench instead of starting another', async () => {
    trainee().on(listOwnAttempts, { attempts: [summary(2, open), summary(1)] });
    await renderApp(path);
    const link = await screen.findByRole('link', { name: 'Go on with your attempt' });
    expect(link).toHaveAttribute('href', `/bench/${id(102)}`);
    expect(screen.queryByRole('button', { name: 'Start on the bench' })).not.toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Handed in, read the debrief' })).toHaveAttribute(
      'href',
      `/attempts/${id(101)}`,
    );
  });

  it('says why an attempt could not be started', async () => {
    const detail = 'This scenario is not published any more.';
    trainee()
      .on(listOwnAttempts, { attempts: [] })
      .on(startAttempt, { status: 409, code: 'scenario-not-published', detail });
    const { user } = await renderApp(path);
    await screen.findByText(/None yet/);
    await user.click(screen.getByRole('button', { name: 'Start on the bench' }));
    expect(await screen.findByText(detail)).toBeInTheDocument();
    expect(screen.getByRole('button', { name: 'Start on the bench' })).toBeEnabled();
  });

  it('says that there is no such job', async () => {
    const detail = 'There is no such job in this organisation.';
    trainee().on(getJob, { status: 404, code: 'not-found', detail });
    await renderApp(path);
    expect(await screen.findByText('The job ticket could not be loaded.')).toBeInTheDocument();
    expect(screen.getByText(detail)).toBeInTheDocument();
  });

  it('offers to sign in again when the session has run out', async () => {
    trainee().on(getJob, { status: 401, code: 'not-signed-in', detail: 'Sign in to go on.' });
    await renderApp(path);
    expect(await screen.findByRole('link', { name: 'Sign in' })).toHaveAttribute(
      'href',
      `/sign-in?then=${encodeURIComponent(path)}`,
    );
  });
});

describe('the practice job', () => {
  it('goes to the bench with the attempt this browser holds', async () => {
    const api = fakeApi()
      .on(whoAmI, { signedIn: null })
      .on(startVisit, { attempt: attempt({ ...open, person: null, scenario: null, id: id(150) }) });
    const { address } = await renderApp('/try');
    await waitFor(() => expect(address()).toBe(`/bench/${id(150)}`));
    expect(api.callsOf(startVisit)).toHaveLength(1);
  });

  it('says what failed and tries again', async () => {
    const api = fakeApi().on(whoAmI, { signedIn: null }).on(startVisit, 'no network');
    const { user, address } = await renderApp('/try');
    await screen.findByText('The practice job could not be loaded.');
    api.on(startVisit, { attempt: attempt({ ...open, id: id(151) }) });
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    await waitFor(() => expect(address()).toBe(`/bench/${id(151)}`));
  });

  it('is offered on the start page with the cautions', async () => {
    fakeApi().on(whoAmI, { signedIn: null });
    await renderApp('/');
    expect(
      await screen.findByRole('link', { name: 'Open a practice job on the bench' }),
    ).toHaveAttribute('href', '/try');
    expect(screen.getByRole('region', { name: 'Cautions' })).toBeInTheDocument();
    expect(await screen.findByRole('link', { name: 'Sign in' })).toBeInTheDocument();
  });
});
