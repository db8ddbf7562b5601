import { act, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { HandIn } from '../../../src/bench/panels/hand-in.tsx';
import { JobSheet } from '../../../src/bench/panels/job-sheet.tsx';
import { benchOnPage } from '../../support/bench-on-page.ts';
import { renderOnBench } from '../../support/render-on-bench.tsx';

const typesOf = (page: ReturnType<typeof benchOnPage>) =>
  page.added.flat().map(({ type, data }) => [type, data]);

describe('the job sheet', () => {
  it('takes a verdict on each part', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <JobSheet />);
    await user.selectOptions(screen.getByLabelText('Verdict on High-voltage diode D1'), 'faulty');
    expect(typesOf(page)).toEqual([['VerdictGiven', { part: 'D1', verdict: 'faulty' }]]);
    expect(screen.getByLabelText('Verdict on High-voltage diode D1')).toHaveValue('faulty');
  });

  it('lists a captured reading under the part it speaks of', () => {
    const page = benchOnPage();
    const { run } = page.bench.getState();
    run({ type: 'SetMeter', data: { setting: 'dc-20' } });
    renderOnBench(page, <JobSheet />);
    act(() => {
      page.bench.setState(({ state }) => ({
        state: {
          ...state,
          sheet: {
            ...state.sheet,
            readings: [
              {
                red: 'T1.HV',
                black: 'T1.core',
                setting: 'ohms-200',
                display: '94.8',
                unit: 'Ω',
                value: 94.8,
                isSettled: true,
                isBeeping: false,
                isRelative: true,
                benchMs: 61_000,
                lifted: ['W23/a'],
              },
            ],
          },
        },
      }));
    });
    const row = screen.getByText('High-voltage transformer').closest('li');
    expect(within(row ?? document.body).getByText(/94\.8 Ω on 200 Ω, REL/)).toBeInTheDocument();
    expect(within(row ?? document.body).getByText('T1.HV – T1.core')).toBeInTheDocument();
  });

  it('states causes from what the part can have, several of them, and takes one back', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <JobSheet />);
    await user.selectOptions(screen.getByLabelText('Part or lead'), 'D1');
    await user.selectOptions(screen.getByLabelText('What is wrong with it'), 'shorted');
    await user.click(screen.getByRole('button', { name: 'State this cause' }));
    await user.selectOptions(screen.getByLabelText('Part or lead'), 'W12');
    await user.selectOptions(screen.getByLabelText('What is wrong with it'), 'open-inside');
    await user.click(screen.getByRole('button', { name: 'State this cause' }));
    expect(page.bench.getState().state.sheet.causes).toEqual([
      { on: 'D1', fault: 'shorted' },
      { on: 'W12', fault: 'open-inside' },
    ]);
    await user.click(screen.getByRole('button', { name: /Take back: D1/ }));
    expect(page.bench.getState().state.sheet.causes).toEqual([{ on: 'W12', fault: 'open-inside' }]);
  });

  it('records the report when a field is left, and only when it has changed', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <JobSheet />);
    await user.type(screen.getByLabelText('What was done'), 'New diode.');
    expect(typesOf(page)).toEqual([]);
    await user.tab();
    expect(typesOf(page)).toEqual([['ReportWritten', { repair: 'New diode.', customer: '' }]]);
    await user.tab();
    expect(page.added).toHaveLength(1);
  });
});

describe('handing in', () => {
  it('lists what is open first, and hands in only when that is confirmed', async () => {
    const page = benchOnPage();
    const onHandedIn = vi.fn();
    const { user } = renderOnBench(page, <HandIn onHandedIn={onHandedIn} />);
    page.bench.getState().run({ type: 'GiveVerdict', data: { part: 'D1', verdict: 'faulty' } });
    await user.click(screen.getByRole('button', { name: /Hand in/ }));
    const dialog = await screen.findByRole('alertdialog');
    expect(within(dialog).getByText('No cause is stated.')).toBeInTheDocument();
    expect(
      within(dialog).getByText('Judged faulty and still in the oven: D1.'),
    ).toBeInTheDocument();
    await user.click(within(dialog).getByRole('button', { name: 'Back to the bench' }));
    expect(page.bench.getState().state.isHandedIn).toBe(false);
    await user.click(screen.getByRole('button', { name: /Hand in/ }));
    await user.click(
      within(await screen.findByRole('alertdialog')).getByRole('button', { name: 'Hand in' }),
    );
    expect(page.bench.getState().state.isHandedIn).toBe(true);
    expect(onHandedIn).toHaveBeenCalledOnce();
  });

  it('says what is missing when the sheet is empty', async () => {
    const page = benchOnPage();
    const onHandedIn = vi.fn();
    const { user } = renderOnBench(page, <HandIn onHandedIn={onHandedIn} />);
    await user.click(screen.getByRole('button', { name: /Hand in/ }));
    await user.click(
      within(await screen.findByRole('alertdialog')).getByRole('button', { name: 'Hand in' }),
    );
    expect(onHandedIn).not.toHaveBeenCalled();
    expect(page.bench.getState().notice).toMatchObject({ text: /The job sheet is empty/ });
  });
});
