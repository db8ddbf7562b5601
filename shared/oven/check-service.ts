import type { OvenPart, ServiceMeasurement } from './oven.ts';
import { partKinds } from './parts/catalogue.ts';
import type { Problem } from './problem.ts';
import { unknownNames } from './problem.ts';

export interface Names {
  parts: readonly string[];
  terminals: readonly string[];
  varnished: readonly string[];
  leadEnds: readonly string[];
  actuators: readonly string[];
  /** references of parts and leads whose own form is wrong */ unjudged: readonly string[];
}

/** Every name that service data of these parts and leads may use. */
export function namesOf(
  parts: readonly OvenPart[],
  leads: readonly string[],
  unjudged: readonly string[],
): Names {
  const terminals = parts.flatMap((part) =>
    partKinds[part.kind]
      .terminals(part.variant)
      .map(({ id, isVarnished }) => ({ ref: `${part.ref}.${id}`, isVarnished })),
  );
  return {
    parts: parts.map(({ ref }) => ref),
    terminals: terminals.map(({ ref }) => ref),
    varnished: terminals.filter(({ isVarnished }) => isVarnished).map(({ ref }) => ref),
    leadEnds: leads.flatMap((lead) => [`${lead}/a`, `${lead}/b`]),
    actuators: parts.filter(({ kind }) => partKinds[kind].actuator).map(({ ref }) => ref),
    unjudged,
  };
}

/** Every name a line of service data gets wrong, and limits the wrong way round. */
export function checkService(
  lines: readonly { at: string; value: ServiceMeasurement }[],
  names: Names,
): Problem[] {
  return lines.flatMap(({ at, value: line }) => {
    const check = (what: string, list: readonly string[], known: readonly string[], key: string) =>
      unknownNames(what, list, known, names.unjudged, `${at}.${key}`);
    const { low, high } = line;
    const limits =
      low !== undefined && high !== undefined && low >= high
        ? [{ path: at, message: `low ${low} is not below high ${high}` }]
        : [];
    return [
      ...check('part', [line.part], names.parts, 'part'),
      ...check('terminal', line.between, names.terminals, 'between'),
      ...check('lead end', line.lift, names.leadEnds, 'lift'),
      ...check('varnished spot', line.clean ?? [], names.varnished, 'clean'),
      ...check('actuator', line.press ?? [], names.actuators, 'press'),
      ...limits,
    ];
  });
}
