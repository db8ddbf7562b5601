import { screen, waitFor, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { whoAmI } from '../../shared/contracts/accounts.ts';
import { startAttempt } from '../../shared/contracts/attempts.ts';
import { getOven, listOvens } from '../../shared/contracts/ovens.ts';
import {
  createScenario,
  getScenario,
  listScenarios,
  publishScenario,
  saveScenario,
} from '../../shared/contracts/scenarios.ts';
import {
  attempt,
  contents,
  id,
  layout,
  oven,
  scenario,
  scenarioSummaries,
  signedInAs,
} from '../support/client-fixtures.ts';
import { fakeApi, type FakeApi } from '../support/fake-api.ts';
import { renderApp } from '../support/render-app.tsx';

const path = `/scenarios/${id(1)}`;

const instructor = (): FakeApi =>
  fakeApi()
    .on(whoAmI, { signedIn: signedInAs('instructor') })
    .on(listScenarios, { scenarios: [...scenarioSummaries] })
    .on(getScenario, { scenario: scenario() })
    .on(listOvens, { ovens: [{ id: oven.id, maker: oven.maker, model: oven.model }] })
    .on(getOven, { definition: oven, layout })
    .on(saveScenario, ({ body }) => ({
      scenario: scenario({ draft: body.draft, hasUnpublishedChanges: true }),
    }));

const openEditor = async (address = path) => {
  const app = await renderApp(address);
  await screen.findByRole('button', { name: 'Add a fault' });
  return app;
};

const save = () => screen.getByRole('button', { name: 'Save draft' });
const inFault = (n: number) => within(screen.getByRole('group', { name: `Fault ${n}` }));
const state = () => within(screen.getByRole('form', { name: 'Scenario' })).getByRole('status');

describe('the scenario list', () => {
  it('shows number, oven, level and what is published', async () => {
    instructor();
    await renderApp('/scenarios');
    const row = await screen.findByRole('row', { name: /Runs quietly/ });
    expect(row).toHaveTextContent('version 2, changed since');
    expect(screen.getByRole('row', { name: /Completely dead/ })).toHaveTextContent(
      'draft, not published',
    );
    expect(screen.getByRole('link', { name: 'Write a scenario' })).toHaveAttribute(
      'href',
      '/scenarios/new',
    );
  });
});

describe('the scenario editor', () => {
  it('opens with the draft as it was saved', async () => {
    instructor();
    await openEditor();
    expect(screen.getByLabelText('Title')).toHaveValue(contents[0].title);
    expect(screen.getByLabelText('Symptom')).toHaveValue('loud hum, no heat');
    expect(inFault(1).getByLabelText('Part or lead')).toHaveValue('D1');
    expect(inFault(1).getByLabelText('What is wrong')).toHaveValue('shorted');
    expect(screen.getByLabelText('Last run, seconds ago')).toHaveValue(900);
    expect(state()).toHaveTextContent('Saved and published as version 2.');
  });

  it('says what is unsaved, saves it, and says that too', async () => {
    const api = instructor();
    const { user } = await openEditor();
    await user.type(screen.getByLabelText('Title'), ', again');
    await waitFor(() => expect(state()).toHaveTextContent('Unsaved changes.'));
    await user.click(save());
    await waitFor(() =>
      expect(state()).toHaveTextContent('Saved. Version 2 is published, this draft is newer.'),
    );
    // The value the file leaves out is the usual one, 0.1 Ω, and is written out.
    expect(api.callsOf(saveScenario)[0]?.body.draft).toEqual({
      ...contents[0],
      title: `${contents[0].title}, again`,
      faults: [{ on: 'D1', fault: 'shorted', values: { ohms: 0.1 } }],
    });
  });

  it('puts each mistake beside its field, keeps what was typed and sends nothing', async () => {
    const api = instructor();
    const { user } = await openEditor();
    await user.clear(screen.getByLabelText('Title'));
    await user.clear(screen.getByLabelText('Complaint'));
    await user.clear(screen.getByLabelText('Last run, seconds ago'));
    await user.type(screen.getByLabelText('Last run, seconds ago'), '90000');
    await user.click(screen.getByRole('button', { name: 'Add a fault' }));
    await user.click(save());
    await waitFor(() =>
      expect(screen.getByLabelText('Title')).toHaveAccessibleDescription(/Fill this in\./),
    );
    expect(screen.getByLabelText('Title')).toHaveFocus();
    expect(screen.getByLabelText('Complaint')).toHaveAccessibleDescription(/Fill this in\./);
    expect(screen.getByLabelText('Last run, seconds ago')).toHaveAccessibleDescription(
      /At most 86400\./,
    );
    expect(screen.getByLabelText('Last run, seconds ago')).toHaveValue(90_000);
    expect(inFault(2).getByLabelText('Part or lead')).toHaveAccessibleDescription(
      'Choose a part or a lead.',
    );
    expect(inFault(2).getByLabelText('What is wrong')).toHaveAccessibleDescription(
      'Choose what is wrong with it.',
    );
    expect(state()).toHaveTextContent('Not saved: 5 fields need another look.');
    expect(api.callsOf(saveScenario)).toHaveLength(0);
  });

  it('offers the faults of the part that was chosen, with values in their unit', async () => {
    const api = instructor();
    const { user } = await openEditor();
    await user.selectOptions(inFault(1).getByLabelText('Part or lead'), 'C1');
    await user.selectOptions(inFault(1).getByLabelText('What is wrong'), 'leaky');
    const leakage = await inFault(1).findByLabelText('Leakage, Ω');
    expect(leakage).toHaveAccessibleDescription(/100 Ω to 8 MΩ, usually 200 kΩ/);
    expect(leakage).toHaveValue('200 k');
    await user.clear(leakage);
    await user.type(leakage, '1,5 M');
    await user.click(save());
    await waitFor(() => expect(api.callsOf(saveScenario)).toHaveLength(1));
    expect(api.callsOf(saveScenario)[0]?.body.draft.faults).toEqual([
      { on: 'C1', fault: 'leaky', values: { ohms: 1_500_000 } },
    ]);
  });

  it.each([
    ['900 M', /outside 100 to 8000000/i, '900 M'],
    ['some', /Enter a number\./, 'some'],
  ])('refuses %s beside the value and leaves it standing', async (typed, message, kept) => {
    const api = instructor();
    const { user } = await openEditor();
    await user.selectOptions(inFault(1).getByLabelText('Part or lead'), 'C1');
    await user.selectOptions(inFault(1).getByLabelText('What is wrong'), 'leaky');
    const leakage = await inFault(1).findByLabelText('Leakage, Ω');
    await user.clear(leakage);
    await user.type(leakage, typed);
    await user.click(save());
    await waitFor(() => expect(leakage).toHaveAccessibleDescription(message));
    expect(leakage).toHaveValue(kept);
    expect(api.callsOf(saveScenario)).toHaveLength(0);
  });

  it('gives leads their own faults, and takes a fault away again', async () => {
    const api = instructor();
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Add a fault' }));
    await user.selectOptions(inFault(2).getByLabelText('Part or lead'), 'W23');
    await user.selectOptions(
      inFault(2).getByLabelText('What is wrong'),
      'left off at its first end',
    );
    await user.click(screen.getByRole('button', { name: 'Remove fault 1' }));
    expect(inFault(1).getByLabelText('Part or lead')).toHaveValue('W23');
    await user.click(save());
    await waitFor(() => expect(api.callsOf(saveScenario)).toHaveLength(1));
    expect(api.callsOf(saveScenario)[0]?.body.draft.faults).toEqual([
      { on: 'W23', fault: 'off-a' },
    ]);
  });

  it('lets a misplaced lead go to the nearest terminal, or to one that is chosen', async () => {
    const api = instructor();
    const { user } = await openEditor();
    await user.selectOptions(inFault(1).getByLabelText('Part or lead'), 'W15');
    await user.selectOptions(inFault(1).getByLabelText('What is wrong'), 'wrong-terminal-a');
    await user.click(save());
    await waitFor(() => expect(api.callsOf(saveScenario)).toHaveLength(1));
    expect(api.callsOf(saveScenario)[0]?.body.draft.faults).toEqual([
      { on: 'W15', fault: 'wrong-terminal-a' },
    ]);
    await user.selectOptions(await inFault(1).findByLabelText('Put on'), 'S1.NO');
    await user.click(save());
    await waitFor(() => expect(api.callsOf(saveScenario)).toHaveLength(2));
    expect(api.callsOf(saveScenario)[1]?.body.draft.faults).toEqual([
      { on: 'W15', fault: 'wrong-terminal-a', other: 'S1.NO' },
    ]);
  });

  it('shows what the server found wrong beside its field and loses nothing', async () => {
    instructor().on(saveScenario, {
      status: 400,
      code: 'invalid-fields',
      detail: 'One field is not valid: draft.title, it names the fault.',
      errors: [{ path: 'draft.title', message: 'It names the fault.' }],
    });
    const { user } = await openEditor();
    await user.type(screen.getByLabelText('Title'), ' (diode)');
    await user.click(save());
    await waitFor(() =>
      expect(screen.getByLabelText('Title')).toHaveAccessibleDescription(/It names the fault\./),
    );
    expect(screen.getByLabelText('Title')).toHaveValue(`${contents[0].title} (diode)`);
    expect(state()).toHaveTextContent('Not saved. One field is not valid');
  });

  it('keeps the form when the session has run out', async () => {
    instructor().on(saveScenario, { status: 401, code: 'not-signed-in', detail: 'Sign in.' });
    const { user } = await openEditor();
    await user.type(screen.getByLabelText('Title'), '!');
    await user.click(save());
    await waitFor(() => expect(state()).toHaveTextContent(/you are signed out/));
    expect(screen.getByLabelText('Title')).toHaveValue(`${contents[0].title}!`);
  });

  it('saves what is on the screen, then tries it on the bench', async () => {
    const trial = attempt({ id: id(170), isTrial: true, status: 'on the bench', score: null });
    const api = instructor().on(startAttempt, { attempt: trial });
    const { user, address } = await openEditor();
    await user.type(screen.getByLabelText('Title'), ' 2');
    await user.click(screen.getByRole('button', { name: 'Try it' }));
    await waitFor(() => expect(address()).toBe(`/bench/${id(170)}`));
    expect(api.calls.map(({ endpoint }) => endpoint).slice(-2)).not.toContain(getScenario);
    expect(api.callsOf(saveScenario)).toHaveLength(1);
    expect(api.callsOf(startAttempt)[0]?.body).toEqual({ scenario: id(1), isTrial: true });
  });

  it('publishes the next version after asking', async () => {
    const api = instructor().on(publishScenario, {
      scenario: scenario({ published: 3, hasUnpublishedChanges: false }),
    });
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Publish version 3' }));
    const dialog = await screen.findByRole('alertdialog');
    expect(api.callsOf(publishScenario)).toHaveLength(0);
    await user.click(within(dialog).getByRole('button', { name: 'Publish version 3' }));
    await waitFor(() => expect(state()).toHaveTextContent('Saved and published as version 3.'));
    expect(await screen.findByRole('button', { name: 'Publish version 4' })).toBeInTheDocument();
    // Nothing was changed, so nothing had to be saved.
    expect(api.callsOf(saveScenario)).toHaveLength(0);
  });

  it('says why it was not published', async () => {
    const detail = 'Nothing has changed since version 2.';
    instructor().on(publishScenario, { status: 409, code: 'scenario-unchanged', detail });
    const { user } = await openEditor();
    await user.click(screen.getByRole('button', { name: 'Publish version 3' }));
    const dialog = await screen.findByRole('alertdialog');
    await user.click(within(dialog).getByRole('button', { name: 'Publish version 3' }));
    await waitFor(() => expect(state()).toHaveTextContent(`Saved, not published. ${detail}`));
  });
});

describe('a new scenario', () => {
  const fill = async (user: Awaited<ReturnType<typeof openEditor>>['user']) => {
    await user.type(screen.getByLabelText('Title'), 'Fuse gone twice');
    await user.type(screen.getByLabelText('Complaint'), 'It goes bang and is dead.');
    await user.type(screen.getByLabelText('Age and use'), '3 years');
    await user.type(screen.getByLabelText('History'), 'New fuse last week.');
    await user.type(screen.getByLabelText('Seen at site'), 'Fuse open.');
  };

  it('is created by the first save, at its own address from then on', async () => {
    const api = instructor().on(createScenario, ({ body }) => ({
      scenario: scenario({
        id: id(77),
        draft: body.draft,
        published: null,
        hasUnpublishedChanges: true,
      }),
    }));
    const { user, address } = await openEditor('/scenarios/new');
    expect(state()).toHaveTextContent('Not saved yet.');
    await fill(user);
    await user.click(save());
    await waitFor(() => expect(address()).toBe(`/scenarios/${id(77)}`));
    expect(screen.getByLabelText('Title')).toHaveValue('Fuse gone twice');
    await waitFor(() => expect(state()).toHaveTextContent('Saved as a draft. Not published.'));
    await user.type(screen.getByLabelText('Title'), '!');
    await user.click(save());
    await waitFor(() => expect(api.callsOf(saveScenario)).toHaveLength(1));
    expect(api.callsOf(createScenario)).toHaveLength(1);
    expect(api.callsOf(saveScenario)[0]?.params).toEqual({ scenario: id(77) });
  });
});

describe('leaving the editor', () => {
  it('asks while something is unsaved, and stays when told so', async () => {
    instructor();
    const { user, address } = await openEditor();
    await user.type(screen.getByLabelText('Title'), '!');
    await waitFor(() => expect(state()).toHaveTextContent('Unsaved changes.'));
    await user.click(screen.getByRole('link', { name: 'All scenarios' }));
    const dialog = await screen.findByRole('alertdialog');
    expect(dialog).toHaveTextContent('Leave without saving?');
    await user.click(within(dialog).getByRole('button', { name: 'Stay here' }));
    await waitFor(() => expect(screen.queryByRole('alertdialog')).not.toBeInTheDocument());
    expect(address()).toBe(path);
    expect(screen.getByLabelText('Title')).toHaveValue(`${contents[0].title}!`);
    await user.click(screen.getByRole('link', { name: 'All scenarios' }));
    await user.click(
      within(await screen.findByRole('alertdialog')).getByRole('button', {
        name: 'Leave and lose the changes',
      }),
    );
    await waitFor(() => expect(address()).toBe('/scenarios'));
  });

  it('asks nothing when all is saved', async () => {
    instructor();
    const { user, address } = await openEditor();
    await user.click(screen.getByRole('link', { name: 'All scenarios' }));
    await waitFor(() => expect(address()).toBe('/scenarios'));
  });

  it('lets the browser ask before the tab closes', async () => {
    instructor();
    const { user } = await openEditor();
    const closing = (): Event => {
      const event = new Event('beforeunload', { cancelable: true });
      window.dispatchEvent(event);
      return event;
    };
    expect(closing().defaultPrevented).toBe(false);
    await user.type(screen.getByLabelText('Title'), '!');
    await waitFor(() => expect(closing().defaultPrevented).toBe(true));
  });
});
