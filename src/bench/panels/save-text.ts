import type { SaveState } from '../../simulation/save-state.ts';

const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });

const steps = (n: number): string => `${n} step${n === 1 ? '' : 's'}`;

/** The state of the record in a few words, as true as we know it. */
export function saveText(save: SaveState): string {
  switch (save.kind) {
    case 'saved':
      return save.at === null ? 'saved' : `saved at ${clock.format(save.at)}`;
    case 'saving':
      return 'saving';
    case 'waiting':
      return `not saved: ${steps(save.steps)} kept ${save.isKept ? 'on this device' : 'in this tab only'}`;
    case 'read-only':
      return 'read only';
    case 'refused':
      return save.steps === 0
        ? 'not saved: refused'
        : `not saved: ${steps(save.steps)} refused, kept on this device`;
  }
}
