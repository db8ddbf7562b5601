import type { Stroke } from './symbol.ts';

/** Where a contact of a row begins, how long it is, and the height of its line. */
interface Place {
  from: number;
  y: number;
}

const hinge = 18;
const rest = 44;

/** A make contact: its blade stands off while open and lies in the line while closed. 60 units long. */
export const makeContact = ({ from, y }: Place, isClosed: boolean): Stroke[] => [
  { d: `M${from} ${y}H${from + hinge}M${from + rest} ${y}H${from + 60}` },
  {
    d: `M${from + hinge} ${y}L${from + (isClosed ? rest : rest - 3)} ${isClosed ? y : y - 15}`,
    kind: 'heavy',
  },
];

/** A break contact: its blade touches a standing tick while closed and is lifted clear of it while open. */
export const breakContact = ({ from, y }: Place, isClosed: boolean): Stroke[] => [
  { d: `M${from} ${y}H${from + hinge}M${from + 60} ${y}H${from + rest}V${y - 9}` },
  {
    d: `M${from + hinge} ${y}L${from + (isClosed ? rest + 4 : rest - 9)} ${y - (isClosed ? 8 : 18)}`,
    kind: 'heavy',
  },
];

/** Height of the blade's middle over its line. */
export const bladeLift = (kind: 'make' | 'break', isClosed: boolean): number =>
  kind === 'make' ? (isClosed ? 0 : 8) : isClosed ? 4 : 11;
