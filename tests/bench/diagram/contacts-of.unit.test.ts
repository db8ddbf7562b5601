import { describe, expect, it } from 'vitest';
import type { OvenPart } from '../../../shared/oven/oven.ts';
import { asFitted } from '../../../shared/oven/initial-state.ts';
import { contactsOf } from '../../../src/bench/diagram/contacts-of.ts';
import { partSymbols } from '../../../src/bench/diagram/symbols/catalogue.ts';
import { definition } from '../../support/larkfield.ts';

const fitted = asFitted(definition, []);
const part = (ref: string, kind: OvenPart['kind'], variant?: string): OvenPart => ({
  ref,
  kind,
  name: ref,
  variant,
});
const primary = part('S1', 'door-switch', 'primary');
const monitor = part('S3', 'door-switch', 'monitor');
const timer = part('K1', 'mechanical-timer');

describe('contacts in the diagram', () => {
  it('follow the door: make contacts close with it, the monitor opens', () => {
    expect(contactsOf(primary, fitted)).toEqual({ contact: true });
    expect(contactsOf(monitor, fitted)).toEqual({ contact: false });
    const open = { ...fitted, isDoorClosed: false };
    expect(contactsOf(primary, open)).toEqual({ contact: false });
    expect(contactsOf(monitor, open)).toEqual({ contact: true });
  });

  it('follow a hand on the lever or the knob', () => {
    const held = { ...fitted, isDoorClosed: false, pressed: ['S1', 'K1'] };
    expect(contactsOf(primary, held)).toEqual({ contact: true });
    expect(contactsOf(monitor, held)).toEqual({ contact: true });
    expect(contactsOf(timer, fitted)).toEqual({ main: false, power: true });
    expect(contactsOf(timer, held)).toEqual({ main: true, power: true });
  });

  it('of a relay close while it is pulled in', () => {
    const relay = part('K2', 'relay');
    expect(contactsOf(relay, fitted)).toEqual({ contact: false });
    expect(contactsOf(relay, { ...fitted, energised: ['K2'] })).toEqual({ contact: true });
  });

  it('tell nothing that only the circuit knows: faults, blown fuses, open cut-outs', () => {
    const faulty = {
      ...fitted,
      opened: ['F1', 'F2'],
      faults: [{ on: 'S1', fault: 'contact-open' }],
    };
    for (const ref of ['F1', 'F2', 'S1']) {
      const one = definition.parts.find((found) => found.ref === ref);
      if (!one) throw new Error(`no ${ref}`);
      const strokes = (oven: typeof fitted) =>
        partSymbols[one.kind](one.variant).strokes(contactsOf(one, oven));
      expect(strokes(faulty), ref).toEqual(strokes(fitted));
    }
  });

  it('are drawn otherwise open than closed, wherever there is one', () => {
    for (const [one, names] of [
      [primary, ['contact']],
      [monitor, ['contact']],
      [part('K2', 'relay'), ['contact']],
      [timer, ['main', 'power']],
    ] as const)
      for (const name of names) {
        const draw = (isClosed: boolean) =>
          partSymbols[one.kind](one.variant).strokes({ [name]: isClosed });
        expect(draw(true), `${one.ref} ${name}`).not.toEqual(draw(false));
      }
  });
});
