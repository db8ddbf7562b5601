import { act, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { HazardNotice, RefusalNotice } from '../../../src/bench/panels/notice-panel.tsx';
import { benchOnPage } from '../../support/bench-on-page.ts';
import { setupWith } from '../../support/bench.ts';
import { renderOnBench } from '../../support/render-on-bench.tsx';

const openBench = (condition: 'guided' | 'assessed') =>
  benchOnPage(setupWith([], { condition }), { isCordIn: false, isCoverOn: false }, { condition });

const plugIn = (page: ReturnType<typeof openBench>) =>
  act(() => {
    page.bench.getState().run({ type: 'PlugCord', data: {} });
  });

describe('a hazard', () => {
  it('is told in plain words, with what comes first when the practice is guided', async () => {
    const page = openBench('guided');
    const { user } = renderOnBench(page, <HazardNotice />);
    expect(screen.queryByRole('region', { name: 'Hazard' })).toBeNull();
    plugIn(page);
    expect(screen.getByText('Mains within reach')).toBeInTheDocument();
    expect(screen.getByText(/One touch of a live tab can stop a heart/)).toBeInTheDocument();
    expect(screen.getByText(/Fit the cover before the cord goes in/)).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Go on' }));
    expect(screen.queryByText('Mains within reach')).toBeNull();
    expect(page.bench.getState().state).toMatchObject({ isCordIn: true, hazards: [{}] });
  });

  it('offers a step back when the practice is guided, which undoes it and leaves it on record', async () => {
    const page = openBench('guided');
    const { user } = renderOnBench(page, <HazardNotice />);
    plugIn(page);
    expect(screen.getByText(/the bench is as it was before this/)).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Step back' }));
    expect(screen.queryByText('Mains within reach')).toBeNull();
    expect(page.bench.getState().state).toMatchObject({ isCordIn: false, hazards: [{}] });
    expect(page.bench.getState().events.map(({ type }) => type)).toEqual([
      'CordPlugged',
      'HazardHappened',
      'SteppedBack',
    ]);
  });

  it('keeps its offer while the display is read', () => {
    const page = openBench('guided');
    renderOnBench(page, <HazardNotice />);
    act(() => {
      const { run } = page.bench.getState();
      run({ type: 'SetMeter', data: { setting: 'dc-20' } });
      run({ type: 'PlaceProbe', data: { probe: 'red', target: 'BAT.pos' } });
      run({ type: 'PlaceProbe', data: { probe: 'black', target: 'BAT.neg' } });
    });
    plugIn(page);
    page.pass(600);
    act(() => {
      page.bench.getState().run({ type: 'TakeReading', data: {} });
    });
    expect(screen.getByRole('button', { name: 'Step back' })).toBeInTheDocument();
  });

  it('is told without the lesson when the attempt is assessed', () => {
    const page = openBench('assessed');
    renderOnBench(page, <HazardNotice />);
    plugIn(page);
    expect(screen.getByText('Mains within reach')).toBeInTheDocument();
    expect(screen.queryByText(/Fit the cover before/)).toBeNull();
    expect(screen.getByText('This is in the record.')).toBeInTheDocument();
    expect(screen.queryByRole('button', { name: 'Step back' })).toBeNull();
  });
});

describe('a refusal', () => {
  it('is one sentence that goes away when it is closed', async () => {
    const page = benchOnPage();
    const { user } = renderOnBench(page, <RefusalNotice />);
    act(() => {
      page.bench.getState().run({ type: 'RemoveCover', data: {} });
    });
    expect(
      screen.getByText('The cord is in. Pull it before you take the cover off.'),
    ).toBeInTheDocument();
    await user.click(screen.getByRole('button', { name: 'Close this note' }));
    expect(screen.queryByText(/The cord is in/)).toBeNull();
  });
});
