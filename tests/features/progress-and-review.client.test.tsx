import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { whoAmI } from '../../shared/contracts/accounts.ts';
import { getDebrief, listForReview, listOwnAttempts } from '../../shared/contracts/attempts.ts';
import { debrief, id, signedInAs, summary } from '../support/client-fixtures.ts';
import { fakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const open = { status: 'on the bench', score: null, handedInAt: null, outcome: null } as const;

const cellsOf = (row: HTMLElement): string[] =>
  within(row)
    .getAllByRole('cell')
    .map((cell) => cell.querySelector('span:last-child')?.textContent ?? '');

describe('progress', () => {
  it('shows handed-in attempts with the score of each skill', async () => {
    const api = fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listOwnAttempts, { attempts: [summary(1), summary(2, open)] })
      .on(getDebrief, { debrief });
    await renderApp('/progress');
    await screen.findByText('85');
    const row = screen.getByRole('row', { name: /Hums louder/ });
    expect(cellsOf(row).slice(1)).toEqual(['72', '40', '80', '90', '85', '–', '60']);
    expect(screen.getAllByRole('rowheader')).toHaveLength(1);
    expect(api.callsOf(getDebrief).map(({ params }) => params.attempt)).toEqual([id(101)]);
  });

  it('says how to begin when nothing was handed in', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listOwnAttempts, { attempts: [summary(2, open)] });
    await renderApp('/progress');
    expect(await screen.findByRole('link', { name: 'Pick a job' })).toHaveAttribute(
      'href',
      '/jobs',
    );
  });

  it('keeps the table when a debrief cannot be had, and says so', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('trainee') })
      .on(listOwnAttempts, { attempts: [summary(1)] })
      .on(getDebrief, 'no network');
    await renderApp('/progress');
    expect(
      await screen.findByText(/The skills of 1 attempts? could not be loaded/),
    ).toBeInTheDocument();
    expect(screen.getByRole('rowheader')).toBeInTheDocument();
  });
});

describe('review', () => {
  it('lists the attempts of the organisation, newest first, each leading to its debrief', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('instructor') })
      .on(listForReview, {
        attempts: [
          summary(1, { startedAt: '2025-03-01T08:00:00.000Z' }),
          summary(2, {
            ...open,
            person: { id: id(810), name: 'Mina Okafor' },
            startedAt: '2025-03-03T08:00:00.000Z',
          }),
          summary(3, { isTrial: true, startedAt: '2025-03-02T08:00:00.000Z' }),
        ],
      });
    await renderApp('/review');
    await screen.findByRole('table');
    const links = screen.getAllByRole('rowheader').map((cell) => within(cell).getByRole('link'));
    expect(links.map((link) => link.getAttribute('href'))).toEqual([
      `/attempts/${id(102)}`,
      `/attempts/${id(103)}`,
      `/attempts/${id(101)}`,
    ]);
    expect(links[0]).toHaveTextContent('Mina Okafor');
    expect(screen.getByText(/\(trial\)/)).toBeInTheDocument();
  });

  it('says what to do when nobody has begun', async () => {
    fakeApi()
      .on(whoAmI, { signedIn: signedInAs('administrator') })
      .on(listForReview, { attempts: [] });
    await renderApp('/review');
    expect(await screen.findByText('Nobody has started an attempt yet.')).toBeInTheDocument();
  });
});
