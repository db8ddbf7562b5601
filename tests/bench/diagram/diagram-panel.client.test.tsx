import { act, fireEvent, screen, within } from '@testing-library/react';
import { describe, expect, it, vi } from 'vitest';
import { DiagramPanel } from '../../../src/bench/diagram/diagram-panel.tsx';
import { layout } from '../../support/client-fixtures.ts';
import { benchOnPage, openBenchOnPage, type BenchOnPage } from '../../support/bench-on-page.ts';
import { renderOnBench } from '../../support/render-on-bench.tsx';

function open(page: BenchOnPage = openBenchOnPage()) {
  const onClose = vi.fn();
  const { user } = renderOnBench(page, <DiagramPanel layout={layout} onClose={onClose} />);
  return { bench: page.bench, user, onClose };
}

const drawn = (ref: string): SVGElement => {
  const found = document.querySelector<SVGElement>(`[data-diagram="${ref}"]`);
  if (!found) throw new Error(`${ref} is not drawn`);
  return found;
};

describe('the wiring diagram beside the bench', () => {
  it('has a named button for every terminal, part and lead, and one tab stop', () => {
    open();
    const sheet = screen.getByRole('group', { name: 'Wiring diagram of the Larkfield LC-28' });
    const buttons = within(sheet).getAllByRole('button');
    expect(drawn('C1.2')).toHaveAccessibleName(
      'C1.2, High-voltage capacitor, diode side, W24 and W27 on it',
    );
    expect(drawn('S3')).toHaveAccessibleName('S3, Monitor switch, contact open');
    expect(drawn('W7')).toHaveAccessibleName(
      'W7, lead, line to primary door switch, black, F2.2 to S1.COM',
    );
    expect(buttons.filter((one) => one.getAttribute('tabindex') === '0')).toHaveLength(1);
  });

  it('shares what is hovered and focused with the bench, both ways', () => {
    const { bench } = open();
    fireEvent.pointerEnter(drawn('W7'));
    expect(bench.getState().hovered).toBe('W7');
    fireEvent.pointerLeave(drawn('W7'));
    expect(bench.getState().hovered).toBeNull();
    act(() => drawn('C1.2').focus());
    expect(bench.getState().focused).toBe('C1.2');
    const plain = drawn('T1.HV').innerHTML;
    act(() => bench.getState().hover('T1.HV'));
    expect(drawn('T1.HV').innerHTML).not.toBe(plain);
  });

  it('draws a lifted lead lifted, its open end a place for a probe', () => {
    const { bench } = open();
    const before = drawn('W7').querySelector('path')?.getAttribute('d');
    act(() => void bench.getState().run({ type: 'LiftLead', data: { end: 'W7/b' } }));
    expect(drawn('W7').querySelector('path')?.getAttribute('d')).not.toBe(before);
    expect(drawn('W7')).toHaveAccessibleName(/black, on F2\.2, lifted from S1\.COM$/);
    act(() => bench.getState().take({ kind: 'probe', probe: 'red' }));
    fireEvent.click(drawn('W7/b'));
    expect(bench.getState().state.probes.red).toBe('W7/b');
    expect(drawn('W7/b').querySelector('[data-probe="red"]')).toBeInTheDocument();
  });

  it('leads a lead that was fitted elsewhere to where it sits now', () => {
    const { bench } = open();
    const before = drawn('W17').querySelector('path')?.getAttribute('d');
    act(() => {
      bench.getState().run({ type: 'LiftLead', data: { end: 'W17/b' } });
      bench.getState().run({ type: 'RefitLead', data: { end: 'W17/b', terminal: 'M2.1' } });
    });
    expect(drawn('W17')).toHaveAccessibleName(/K2\.2 to M2\.1$/);
    expect(drawn('W17').querySelector('path')?.getAttribute('d')).not.toBe(before);
  });

  it('opens the contacts of the door switches with the door', () => {
    const { bench } = open();
    act(() => void bench.getState().run({ type: 'OpenDoor', data: {} }));
    expect(drawn('S1')).toHaveAccessibleName('S1, Primary door switch, contact open');
    expect(drawn('S3')).toHaveAccessibleName('S3, Monitor switch, contact closed');
  });

  it('goes to the neighbour by arrow keys, picks by Enter, closes by Escape', async () => {
    const { bench, user, onClose } = open();
    act(() => drawn('K1.2').focus());
    await user.keyboard('{ArrowRight}');
    expect(document.activeElement).toBe(drawn('T1.1'));
    // The diagram lies over the mat in this narrow window, so it makes room for what can be done.
    await user.keyboard('{Enter}');
    expect(bench.getState().selection).toEqual({ kind: 'target', ref: 'T1.1' });
    expect(onClose).toHaveBeenCalledOnce();
    await user.keyboard('{Escape}');
    expect(onClose).toHaveBeenCalledTimes(2);
  });

  it('lets nothing behind the cover be picked while it is on', () => {
    const { bench } = open(benchOnPage());
    expect(drawn('C1.2')).toHaveAttribute('aria-disabled', 'true');
    fireEvent.click(drawn('C1.2'));
    expect(bench.getState().selection).toBeNull();
    fireEvent.click(drawn('P1.L'));
    expect(bench.getState().selection).toEqual({ kind: 'target', ref: 'P1.L' });
  });

  it('prints the sheet with the model and the caution', async () => {
    const print = vi.fn();
    vi.stubGlobal('print', print);
    const { user } = open();
    await user.click(screen.getByRole('button', { name: 'Print the diagram' }));
    expect(print).toHaveBeenCalledOnce();
    const sheet = document.querySelector('[data-diagram-print]');
    expect(sheet).toHaveTextContent('Larkfield LC-28, 120 V 60 Hz: wiring diagram');
    expect(sheet).toHaveTextContent('A real oven can kill with its plug out');
    vi.unstubAllGlobals();
  });
});
