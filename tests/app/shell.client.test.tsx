import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { signOut, whoAmI, workIn } from '../../shared/contracts/accounts.ts';
import { listForReview, listOwnAttempts } from '../../shared/contracts/attempts.ts';
import { listPeople } from '../../shared/contracts/people.ts';
import { listJobs, listScenarios } from '../../shared/contracts/scenarios.ts';
import { jobs, signedInAs } from '../support/client-fixtures.ts';
import { fakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const places = (): string[] =>
  within(screen.getByRole('navigation', { name: 'Pages' }))
    .getAllByRole('link')
    .map((link) => link.textContent);

describe('the shell', () => {
  it.each([
    ['trainee', ['Jobs', 'Progress']],
    ['instructor', ['Scenarios', 'Review', 'Jobs', 'Progress']],
    ['administrator', ['People', 'Review', 'Jobs', 'Progress']],
  ] as const)('shows a %s the pages of that role', async (role, expected) => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs(role) })
      .on(listJobs, { jobs: [...jobs] });
    await renderApp('/jobs');
    await screen.findByRole('table');
    expect(places()).toEqual(expected);
  });

  it('moves the focus to the heading after navigation, and not on the first load', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listJobs, { jobs: [...jobs] })
      .on(listOwnAttempts, { attempts: [] });
    const { user } = await renderApp('/jobs');
    const heading = await screen.findByRole('heading', { level: 1, name: 'Jobs' });
    expect(heading).not.toHaveFocus();
    await user.click(screen.getByRole('link', { name: 'Progress' }));
    const next = await screen.findByRole('heading', { level: 1, name: 'Progress' });
    await waitFor(() => expect(next).toHaveFocus());
    expect(document.title).toBe('Progress – Coldbench');
  });

  it('starts with a link over the header', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listJobs, { jobs: [...jobs] });
    const { user } = await renderApp('/jobs');
    await screen.findByRole('table');
    await user.tab();
    expect(screen.getByRole('link', { name: 'Skip to the content' })).toHaveFocus();
    expect(screen.getByRole('link', { name: 'Skip to the content' })).toHaveAttribute(
      'href',
      `#${screen.getByRole('main').id}`,
    );
  });

  it('sends a visitor to sign in and keeps where they were going', async () => {
    fakeApi().on(whoAmI, { signedIn: null });
    const { address } = await renderApp('/jobs?level=2');
    await screen.findByRole('heading', { level: 1, name: 'Sign in' });
    expect(address()).toBe('/sign-in?then=%2Fjobs%3Flevel%3D2');
  });

  it('tells a trainee that a page is for another role', async () => {
    const api = fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listScenarios, { scenarios: [] })
      .on(listPeople, { people: [] })
      .on(listForReview, { attempts: [] });
    await renderApp('/people');
    await screen.findByRole('heading', { level: 1, name: 'Not for your role' });
    expect(screen.getByText(/You work in Northgate Trade School as trainee/)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'Go to your own start page' })).toHaveAttribute(
      'href',
      '/jobs',
    );
    expect(api.callsOf(listPeople)).toHaveLength(0);
  });

  it('offers to try again when nobody knows who is signed in', async () => {
    const api = fakeApi().on(whoAmI, 'nonsense');
    const { user } = await renderApp('/jobs');
    await screen.findByText('Your account could not be loaded.');
    api.on(whoAmI, { signedIn: signedInAs('trainee') }).on(listJobs, { jobs: [] });
    await user.click(screen.getByRole('button', { name: 'Try again' }));
    expect(await screen.findByText('There are no jobs yet.')).toBeInTheDocument();
  });

  it('signs out and drops what was fetched', async () => {
    const api = fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listJobs, { jobs: [...jobs] })
      .on(signOut, {});
    const { user, address } = await renderApp('/jobs');
    await user.click(await screen.findByRole('button', { name: 'Tom Reyes' }));
    await user.click(screen.getByRole('button', { name: 'Sign out' }));
    await waitFor(() => expect(api.callsOf(signOut)).toHaveLength(1));
    expect(await screen.findByRole('link', { name: 'Sign in' })).toBeInTheDocument();
    await waitFor(() => expect(address()).toBe('/'));
    expect(screen.queryByRole('button', { name: 'Tom Reyes' })).not.toBeInTheDocument();
  });

  it('switches the organisation when there is more than one', async () => {
    const own = signedInAs('trainee', ['instructor']);
    const other = own.memberships[1]?.organisation;
    if (!other) throw new Error('the fixture has a second membership');
    const api = fakeApi()
      .on(whoAmI, { signedIn: own })
      .on(listJobs, { jobs: [...jobs] })
      .on(listScenarios, { scenarios: [] })
      .on(workIn, { signedIn: { ...own, organisation: other, role: 'instructor' } });
    const { user } = await renderApp('/jobs');
    await user.click(await screen.findByRole('button', { name: 'Tom Reyes' }));
    expect(screen.getByText('trainee in Northgate Trade School')).toBeInTheDocument();
    await user.click(
      screen.getByRole('button', { name: 'Work in Hollin Road Workshop as instructor' }),
    );
    expect(await screen.findByText('There are no scenarios yet.')).toBeInTheDocument();
    expect(api.callsOf(workIn)[0]?.body).toEqual({ organisation: other.id });
  });

  it('closes the account menu with Escape and gives the focus back', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listJobs, { jobs: [...jobs] });
    const { user } = await renderApp('/jobs');
    const button = await screen.findByRole('button', { name: 'Tom Reyes' });
    await user.click(button);
    expect(button).toHaveAttribute('aria-expanded', 'true');
    await user.keyboard('{Escape}');
    expect(button).toHaveAttribute('aria-expanded', 'false');
    expect(button).toHaveFocus();
  });

  it('says that nothing is at an unknown address', async () => {
    fakeApi().on(whoAmI, { signedIn: null });
    await renderApp('/jbos');
    await screen.findByRole('heading', { level: 1, name: 'No such page' });
    expect(screen.getByRole('link', { name: 'Go to the start page' })).toHaveAttribute('href', '/');
  });
});
