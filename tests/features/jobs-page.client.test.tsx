import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { whoAmI } from '../../shared/contracts/accounts.ts';
import { listJobs } from '../../shared/contracts/scenarios.ts';
import { jobs, signedInAs } from '../support/client-fixtures.ts';
import { fakeApi, type FakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const trainee = (): FakeApi => fakeApi().on(whoAmI, { signedIn: signedInAs('trainee') });

const titlesShown = (): string[] =>
  screen.getAllByRole('rowheader').map((cell) => within(cell).getByRole('link').textContent);

describe('the job list', () => {
  it('shows each job with what a trainee may know of it', async () => {
    trainee().on(listJobs, { jobs: [...jobs] });
    await renderApp('/jobs');
    const row = await screen.findByRole('row', { name: /Hums louder than before/ });
    for (const text of [
      'loud hum, no heat',
      'Larkfield LC-28',
      '120 V 60 Hz, 15 A',
      'guided',
      '72',
    ])
      expect(within(row).getByText(text)).toBeInTheDocument();
    expect(within(row).getByRole('link')).toHaveAttribute('href', `/jobs/${jobs[0].scenario}`);
    expect(document.title).toBe('Jobs – Coldbench');
  });

  it('sorts by level first, by another column when its head is pressed, and keeps that in the address', async () => {
    trainee().on(listJobs, { jobs: [...jobs] });
    const { user, address } = await renderApp('/jobs');
    await screen.findByRole('table');
    expect(titlesShown()).toEqual([jobs[2].title, jobs[0].title, jobs[1].title]);
    await user.click(screen.getByRole('button', { name: 'Best' }));
    await waitFor(() => expect(address()).toBe('/jobs?sort=best'));
    // Never attempted stands last either way.
    expect(titlesShown()).toEqual([jobs[0].title, jobs[2].title, jobs[1].title]);
    await user.click(screen.getByRole('button', { name: 'Best' }));
    await waitFor(() => expect(address()).toBe('/jobs?sort=-best'));
    expect(titlesShown()).toEqual([jobs[2].title, jobs[0].title, jobs[1].title]);
    expect(screen.getByRole('columnheader', { name: 'Best' })).toHaveAttribute(
      'aria-sort',
      'descending',
    );
  });

  it('filters by symptom, level and word, in the address', async () => {
    trainee().on(listJobs, { jobs: [...jobs] });
    const { user, address } = await renderApp('/jobs');
    await screen.findByRole('table');
    await user.selectOptions(screen.getByLabelText('Symptom'), 'dead, no display');
    await waitFor(() => expect(titlesShown()).toEqual([jobs[2].title]));
    await user.selectOptions(screen.getByLabelText('Symptom'), 'any');
    await user.type(screen.getByLabelText('Search'), 'quieter');
    await waitFor(() => expect(titlesShown()).toEqual([jobs[1].title]));
    expect(screen.getByLabelText('Search')).toHaveValue('quieter');
    await waitFor(() => expect(address()).toBe('/jobs?text=quieter'));
  });

  it('opens filtered from an address and offers all jobs when nothing matches', async () => {
    trainee().on(listJobs, { jobs: [...jobs] });
    const { user } = await renderApp('/jobs?level=5&text=canteen');
    expect(await screen.findByText('No job matches.')).toBeInTheDocument();
    expect(screen.getByLabelText('Level')).toHaveValue('5');
    await user.click(screen.getByRole('button', { name: 'Show all jobs' }));
    await waitFor(() => expect(titlesShown()).toHaveLength(3));
    expect(screen.getByLabelText('Search')).toHaveValue('');
  });

  it('says that it is loading', async () => {
    trainee().on(listJobs, 'never');
    await renderApp('/jobs');
    expect(await screen.findByText('Loading the jobs.')).toBeInTheDocument();
  });

  it('says what to do when there is none', async () => {
    trainee().on(listJobs, { jobs: [] });
    await renderApp('/jobs');
    expect(await screen.findByText('There are no jobs yet.')).toBeInTheDocument();
    expect(screen.getByText(/An instructor publishes them/)).toBeInTheDocument();
  });

  it('says what failed and loads again on request', async () => {
    const api = trainee().on(listJobs, 'no network');
    const { user } = await renderApp('/jobs');
    expect(await screen.findByText('The jobs could not be loaded.')).toBeInTheDocument();
    expect(screen.getByText(/The server cannot be reached/)).toBeInTheDocument();
    api.on(listJobs, { jobs: [...jobs] });
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByRole('table')).toBeInTheDocument();
  });
});
