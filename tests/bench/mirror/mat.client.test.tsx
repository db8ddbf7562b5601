import { act, screen, waitFor, within } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { Announcer } from '../../../src/bench/mirror/announcer.tsx';
import { Mat } from '../../../src/bench/panels/mat.tsx';
import { useShortcuts } from '../../../src/bench/panels/use-shortcuts.ts';
import { layout } from '../../support/client-fixtures.ts';
import { benchOnPage, openBenchOnPage } from '../../support/bench-on-page.ts';
import { setupWith } from '../../support/bench.ts';
import { renderOnBench } from '../../support/render-on-bench.tsx';

const Place = ({ onHelp = vi.fn(), onLeave = vi.fn() }) => {
  const [isListOpen, setIsListOpen] = useState(false);
  const onKeyDown = useShortcuts(onHelp, vi.fn(), () => false);
  return (
    <div onKeyDown={onKeyDown}>
      <button type="button" onClick={() => setIsListOpen(true)}>
        list
      </button>
      <Mat
        layout={layout}
        isRunOpen={false}
        onRunClose={vi.fn()}
        isListOpen={isListOpen}
        onListClose={() => setIsListOpen(false)}
        onLeave={onLeave}
      />
      <Announcer />
    </div>
  );
};

const terminals = () => screen.getByRole('region', { name: 'Bench terminals' });
const button = (ref: string) =>
  within(terminals())
    .getAllByRole('button')
    .find((one) => one.dataset['mirror'] === ref) ?? document.body;
const here = () => (document.activeElement as HTMLElement | null)?.dataset['mirror'];
const focus = (ref: string) => act(() => button(ref).focus());

describe('the bench by keyboard', () => {
  it('is one tab stop', () => {
    renderOnBench(openBenchOnPage(), <Place />);
    const stops = within(terminals())
      .getAllByRole('button')
      .filter((one) => one.tabIndex === 0);
    expect(stops).toHaveLength(1);
  });

  it('goes to the neighbour on the bench by arrow keys, and draws the focus on the canvas', async () => {
    const page = openBenchOnPage();
    const { user } = renderOnBench(page, <Place />);
    focus('C1.2');
    await user.keyboard('{ArrowRight}');
    expect(here()).toBe('C1.1');
    await user.keyboard('{ArrowLeft}');
    expect(here()).toBe('C1.2');
    expect(page.bench.getState().focused).toBe('C1.2');
    expect(button('C1.2')).toHaveAttribute('tabindex', '0');
  });

  it('goes to a terminal by its name', async () => {
    const { user } = renderOnBench(openBenchOnPage(), <Place />);
    focus('C1.2');
    await user.keyboard('t1.h');
    expect(here()).toBe('T1.HV');
  });

  it('goes by name also where the name begins like a shortcut', async () => {
    const { user } = renderOnBench(openBenchOnPage(), <Place />);
    focus('C1.2');
    await user.keyboard('/d1');
    expect(here()).toBe('D1');
  });

  it('goes through terminals, parts and leads in the order of the list', async () => {
    const { user } = renderOnBench(openBenchOnPage(), <Place />);
    focus('C1');
    await user.keyboard('{PageDown}');
    expect(here()).toBe('C1.1');
    await user.keyboard('{PageUp}{PageUp}');
    expect(here()).toBe('T1.core');
    await user.keyboard('{End}');
    expect(here()).toBe('W32');
  });

  it('measures without a pointer: take, go, tap, go, tap', async () => {
    const page = openBenchOnPage();
    const { user } = renderOnBench(page, <Place />);
    focus('C1.2');
    await user.keyboard('r{Enter}{ArrowRight}{Enter}');
    expect(page.bench.getState().state.probes).toEqual({ red: 'C1.2', black: 'C1.1' });
    expect(button('C1.2')).toHaveAccessibleName(
      'C1.2, High-voltage capacitor, diode side, red probe on it, W24 and W27 on it',
    );
  });

  it('steps back from a hazard, and says why not where there was none', async () => {
    const page = benchOnPage(setupWith([], { condition: 'guided' }), {
      isCordIn: false,
      isCoverOn: false,
    });
    const { user } = renderOnBench(page, <Place />);
    focus('C1.2');
    await user.keyboard('u');
    expect(page.bench.getState().notice).toMatchObject({
      kind: 'refusal',
      text: 'You can step back only right after a hazard.',
    });
    act(() => {
      page.bench.getState().run({ type: 'PlugCord', data: {} });
    });
    await user.keyboard('u');
    expect(page.bench.getState().state).toMatchObject({ isCordIn: false, hazards: [{}] });
    expect(here()).toBe('C1.2');
  });

  it('opens what can be done there, and comes back to the terminal by Escape', async () => {
    const page = openBenchOnPage();
    const { user } = renderOnBench(page, <Place />);
    focus('C1.1');
    await user.keyboard('{Enter}');
    // The panel takes the focus; it has no place on a view of no size, so it is drawn as a sheet.
    const panel = await screen.findByRole('region', { name: /^C1\.1, / });
    await waitFor(() => expect(panel).toHaveFocus());
    await user.click(within(panel).getByRole('button', { name: 'Red probe here' }));
    expect(page.bench.getState().state.probes.red).toBe('C1.1');
    await waitFor(() => expect(here()).toBe('C1.1'));
  });

  it('puts down by Escape first, then leaves', async () => {
    const page = openBenchOnPage();
    const onLeave = vi.fn();
    const { user } = renderOnBench(page, <Place onLeave={onLeave} />);
    focus('C1.1');
    await user.keyboard('r{Escape}');
    expect(page.bench.getState().hand).toEqual({ kind: 'empty' });
    expect(onLeave).not.toHaveBeenCalled();
    await user.keyboard('{Escape}');
    expect(onLeave).toHaveBeenCalledOnce();
  });

  it('has its shortcuts only here, and lists them', async () => {
    const page = openBenchOnPage();
    const onHelp = vi.fn();
    const { user } = renderOnBench(page, <Place onHelp={onHelp} />);
    await user.keyboard('r');
    expect(page.bench.getState().hand).toEqual({ kind: 'empty' });
    focus('C1.1');
    await user.keyboard('d');
    expect(page.bench.getState().hand).toEqual({ kind: 'discharge-clip' });
    await user.keyboard('?');
    expect(onHelp).toHaveBeenCalledOnce();
  });

  it('shows the same buttons as a list, in its own order, and hides it by Escape', async () => {
    const page = openBenchOnPage();
    const { user } = renderOnBench(page, <Place />);
    const before = within(terminals()).getAllByRole('button').length;
    await user.click(screen.getByRole('button', { name: 'list' }));
    expect(terminals()).toHaveAttribute('data-shown', 'true');
    expect(within(terminals()).getAllByRole('button')).toHaveLength(before + 1);
    focus('C1.1');
    await user.keyboard('{ArrowDown}');
    expect(here()).toBe('C1.2');
    await user.keyboard('{Escape}');
    expect(terminals()).toHaveAttribute('data-shown', 'false');
  });

  it('has nothing inside while the cover is on', () => {
    renderOnBench(benchOnPage(), <Place />);
    expect(button('C1.1')).toBe(document.body);
    expect(screen.getByText('The cover is on: nothing inside can be reached.')).toBeInTheDocument();
  });
});

describe('the one voice of the bench', () => {
  it('says things one after the other', async () => {
    const page = openBenchOnPage();
    renderOnBench(page, <Place />);
    const voice = screen.getByRole('status');
    act(() => {
      page.bench.getState().take({ kind: 'probe', probe: 'red' });
      page.bench.getState().tap('C1.1');
    });
    expect(voice).toHaveTextContent('red probe in hand');
    await waitFor(() => expect(voice).toHaveTextContent('red probe on C1.1'), { timeout: 3000 });
    await waitFor(() => expect(voice).toHaveTextContent('black probe in hand'), { timeout: 3000 });
  });
});
