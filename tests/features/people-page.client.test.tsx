import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { whoAmI } from '../../shared/contracts/accounts.ts';
import { changeRole, listPeople, type Person } from '../../shared/contracts/people.ts';
import { id, signedInAs } from '../support/client-fixtures.ts';
import { fakeApi, type FakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const person = (n: number, name: string, role: Person['role']): Person => ({
  id: id(n),
  name,
  email: `${name.split(' ')[0]?.toLowerCase()}@northgate.example`,
  role,
  joinedAt: '2025-01-04T09:30:00.000Z',
  attempts: 3,
});

const mina = person(810, 'Mina Okafor', 'trainee');

const administrator = (): FakeApi =>
  fakeApi()
    .on(whoAmI, { signedIn: signedInAs('administrator') })
    .on(listPeople, { people: [person(800, 'Tom Reyes', 'administrator'), mina] });

const choose = async (role: string) => {
  const { user } = await renderApp('/people');
  await user.selectOptions(await screen.findByLabelText('Role of Mina Okafor'), role);
  return { user, dialog: await screen.findByRole('alertdialog') };
};

describe('people', () => {
  it('changes a role after it was confirmed', async () => {
    const api = administrator().on(changeRole, { person: { ...mina, role: 'instructor' } });
    const { user, dialog } = await choose('instructor');
    expect(dialog).toHaveTextContent('Make Mina Okafor an instructor?');
    expect(api.callsOf(changeRole)).toHaveLength(0);
    await user.click(within(dialog).getByRole('button', { name: 'Make an instructor' }));
    await waitFor(() => expect(screen.queryByRole('alertdialog')).not.toBeInTheDocument());
    expect(api.callsOf(changeRole)[0]).toMatchObject({
      params: { person: mina.id },
      body: { role: 'instructor' },
    });
    expect(screen.getByLabelText('Role of Mina Okafor')).toHaveValue('instructor');
  });

  it('leaves the role as it is when it was not confirmed', async () => {
    const api = administrator();
    const { user, dialog } = await choose('administrator');
    await user.click(within(dialog).getByRole('button', { name: 'Leave as trainee' }));
    await waitFor(() => expect(screen.queryByRole('alertdialog')).not.toBeInTheDocument());
    expect(screen.getByLabelText('Role of Mina Okafor')).toHaveValue('trainee');
    await waitFor(() => expect(screen.getByLabelText('Role of Mina Okafor')).toHaveFocus());
    expect(api.callsOf(changeRole)).toHaveLength(0);
  });

  it('says in the dialog why a role could not be changed', async () => {
    const detail = 'An organisation needs an administrator.';
    administrator().on(changeRole, { status: 403, code: 'not-allowed', detail });
    const { user, dialog } = await choose('instructor');
    await user.click(within(dialog).getByRole('button', { name: 'Make an instructor' }));
    expect(await within(dialog).findByText(detail)).toBeInTheDocument();
    expect(screen.getByLabelText('Role of Mina Okafor')).toHaveValue('trainee');
  });

  it('warns before one changes one’s own role', async () => {
    administrator();
    const { user } = await renderApp('/people');
    await user.selectOptions(await screen.findByLabelText('Role of Tom Reyes'), 'trainee');
    expect(await screen.findByRole('alertdialog')).toHaveTextContent('This is you');
  });
});
