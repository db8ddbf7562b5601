import { screen, waitFor } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { signIn, signUp, whoAmI } from '../../shared/contracts/accounts.ts';
import { getAttempt } from '../../shared/contracts/attempts.ts';
import { listJobs } from '../../shared/contracts/scenarios.ts';
import { attempt, id, jobs, signedInAs } from '../support/client-fixtures.ts';
import { fakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const visitor = () => fakeApi().on(whoAmI, { signedIn: null });

describe('signing in', () => {
  it('names each empty field beside it and sends nothing', async () => {
    const api = visitor();
    const { user } = await renderApp('/sign-in');
    await user.type(await screen.findByLabelText('E-mail'), 'tom');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    await waitFor(() =>
      expect(screen.getByLabelText('E-mail')).toHaveAccessibleDescription(
        'Enter an e-mail address, such as name@school.example.',
      ),
    );
    expect(screen.getByLabelText('Password')).toHaveAccessibleDescription('Enter your password.');
    expect(screen.getByLabelText('E-mail')).toHaveFocus();
    expect(screen.getByLabelText('E-mail')).toHaveValue('tom');
    expect(api.callsOf(signIn)).toHaveLength(0);
  });

  it('says what the server refused and keeps what was typed', async () => {
    const detail = 'The e-mail address or the password is wrong.';
    visitor().on(signIn, { status: 401, code: 'wrong-credentials', detail });
    const { user } = await renderApp('/sign-in');
    await user.type(await screen.findByLabelText('E-mail'), 'tom@northgate.example');
    await user.type(screen.getByLabelText('Password'), 'not this one');
    await user.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(detail);
    expect(screen.getByLabelText('E-mail')).toHaveValue('tom@northgate.example');
  });

  it('goes on to where the person was going', async () => {
    const api = visitor()
      .on(signIn, { signedIn: signedInAs('trainee') })
      .on(listJobs, { jobs: [...jobs] });
    const { user, address } = await renderApp('/sign-in?then=%2Fjobs%3Flevel%3D2');
    await user.type(await screen.findByLabelText('E-mail'), ' Tom@Northgate.example');
    await user.type(screen.getByLabelText('Password'), 'cold-bench-demo{Enter}');
    await waitFor(() => expect(address()).toBe('/jobs?level=2'));
    expect(api.callsOf(signIn)[0]?.body).toEqual({
      email: 'tom@northgate.example',
      password: 'cold-bench-demo',
    });
  });

  it('never follows an address that leaves the site', async () => {
    visitor()
      .on(signIn, { signedIn: signedInAs('trainee') })
      .on(listJobs, { jobs: [...jobs] });
    const { user, address } = await renderApp('/sign-in?then=%2F%2Felsewhere.example');
    await user.type(await screen.findByLabelText('E-mail'), 'tom@northgate.example');
    await user.type(screen.getByLabelText('Password'), 'cold-bench-demo{Enter}');
    await waitFor(() => expect(address()).toBe('/jobs'));
  });
});

describe('creating an account', () => {
  const fill = async (user: Awaited<ReturnType<typeof renderApp>>['user'], password: string) => {
    await user.type(await screen.findByLabelText('Name'), 'Mina Okafor');
    await user.type(screen.getByLabelText('E-mail'), 'mina@northgate.example');
    await user.type(screen.getByLabelText('Password'), password);
    await user.click(screen.getByRole('button', { name: 'Create account' }));
  };

  it('asks for a longer password beside the field', async () => {
    const api = visitor();
    const { user } = await renderApp('/sign-up');
    await fill(user, 'short');
    await waitFor(() =>
      expect(screen.getByLabelText('Password')).toHaveAccessibleDescription(
        /Enter 10 to 128 characters/,
      ),
    );
    expect(api.callsOf(signUp)).toHaveLength(0);
  });

  it('goes to the attempt that came along', async () => {
    visitor()
      .on(signUp, { signedIn: signedInAs('trainee'), keptAttempt: id(101) })
      .on(getAttempt, { attempt: attempt({ status: 'on the bench', score: null }) });
    const { user, address } = await renderApp('/sign-up');
    await fill(user, 'three plain words');
    await waitFor(() => expect(address()).toBe(`/attempts/${id(101)}`));
  });

  it('says that an address is taken', async () => {
    const detail = 'There is an account with this e-mail address. Sign in instead.';
    visitor().on(signUp, { status: 409, code: 'email-taken', detail });
    const { user } = await renderApp('/sign-up');
    await fill(user, 'three plain words');
    expect(await screen.findByRole('alert')).toHaveTextContent(detail);
  });
});

describe('the account page', () => {
  it('shows name, e-mail and where the person works', async () => {
    fakeApi().on(whoAmI, { signedIn: signedInAs('trainee', ['instructor']) });
    await renderApp('/account');
    expect(await screen.findByText('tom@northgate.example')).toBeInTheDocument();
    expect(screen.getByText('Hollin Road Workshop')).toBeInTheDocument();
    expect(screen.getByText('working here now')).toBeInTheDocument();
  });
});
