import type { z } from 'zod';
import { checkService, namesOf } from './check-service.ts';
import type { OvenDefinition, OvenPart } from './oven.ts';
import { ovenDefinition, ovenLead, ovenPart, partKindName, serviceMeasurement } from './oven.ts';
import { partKinds } from './parts/catalogue.ts';
import type { Problem } from './problem.ts';
import { repeatedNames, unknownName, unknownNames } from './problem.ts';

export type ParsedOven = { ok: true; oven: OvenDefinition } | { ok: false; problems: Problem[] };

/** What of a list has the right form, each with its place: so that one bad entry does not hide mistakes in the others. */
function wellFormed<T>(
  input: unknown,
  key: string,
  schema: z.ZodType<T>,
): { at: string; value: T }[] {
  const list = typeof input === 'object' && input !== null ? Reflect.get(input, key) : undefined;
  if (!Array.isArray(list)) return [];
  return list.flatMap((entry: unknown, index) => {
    const parsed = schema.safeParse(entry);
    return parsed.success ? [{ at: `${key}.${index}`, value: parsed.data }] : [];
  });
}

function valueAt(input: unknown, path: readonly PropertyKey[]): unknown {
  return path.reduce<unknown>(
    (value, key) =>
      typeof value === 'object' && value !== null ? Reflect.get(value, key) : undefined,
    input,
  );
}

function formProblems(input: unknown): Problem[] {
  const parsed = ovenDefinition.safeParse(input);
  if (parsed.success) return [];
  return parsed.error.issues.map((issue) => {
    const path = issue.path.join('.');
    const value = valueAt(input, issue.path);
    return /^parts\.\d+\.kind$/.test(path) && typeof value === 'string'
      ? unknownName('kind', value, partKindName.options, path)
      : { path, message: issue.message };
  });
}

function partProblems(parts: { at: string; value: z.infer<typeof ovenPart> }[]): Problem[] {
  return parts.flatMap(({ at, value: part }) => {
    const kind = partKinds[part.kind];
    const known = Object.keys(kind.values);
    const values = Object.keys(part.values ?? {})
      .filter((name) => !known.includes(name))
      .map((name) => unknownName('value', name, known, `${at}.values.${name}`));
    const variants = kind.variants ?? [];
    if (part.variant === undefined && variants.length > 0 && kind.usual === undefined)
      values.push({ path: at, message: `${part.ref} needs a variant: ${variants.join(', ')}` });
    if (part.variant !== undefined && !variants.includes(part.variant))
      values.push(unknownName('variant', part.variant, variants, `${at}.variant`));
    return values;
  });
}

/** References of entries whose form is wrong: what names them is not judged, so that one mistake is named once. */
function malformedRefs(input: unknown, key: string, formed: readonly { at: string }[]): string[] {
  const list = valueAt(input, [key]);
  if (!Array.isArray(list)) return [];
  return list.flatMap((_, index) => {
    const ref = valueAt(list, [index, 'ref']);
    const isFormed = formed.some(({ at }) => at === `${key}.${index}`);
    return typeof ref === 'string' && !isFormed ? [ref] : [];
  });
}

const controlPart = {
  electronic: 'control-board',
  'mechanical timer': 'mechanical-timer',
} as const;

/** What starts the oven has to be among its parts: a run asks the parts, not the word. */
function controlProblems(
  input: unknown,
  parts: readonly { value: OvenPart }[],
  unjudged: readonly string[],
): Problem[] {
  const control = ovenDefinition.shape.control.safeParse(valueAt(input, ['control']));
  if (!control.success) return [];
  const wanted = controlPart[control.data];
  const others = Object.values(controlPart).filter((kind) => kind !== wanted);
  const has = (kind: string): boolean => parts.some(({ value }) => value.kind === kind);
  const missing =
    has(wanted) || unjudged.length > 0 ? [] : [`${control.data} control needs a ${wanted}`];
  const surplus = others
    .filter(has)
    .map((kind) => `${control.data} control has no place for a ${kind}`);
  return [...missing, ...surplus].map((message) => ({ path: 'control', message }));
}

const named = (entries: readonly { at: string; value: { ref: string } }[]) =>
  entries.map(({ at, value }) => ({ at, name: value.ref }));

/**
 * An oven definition from a file. Names every mistake at once: form, repeated references, unknown
 * kinds, variants and values, leads and service data that name what the oven does not have.
 */
export function parseOven(input: unknown): ParsedOven {
  const parts = wellFormed(input, 'parts', ovenPart);
  const leads = wellFormed(input, 'leads', ovenLead);
  const service = wellFormed(input, 'serviceData', serviceMeasurement);
  const unjudged = [
    ...malformedRefs(input, 'parts', parts),
    ...malformedRefs(input, 'leads', leads),
  ];
  const names = namesOf(
    parts.map(({ value }) => value),
    leads.map(({ value }) => value.ref),
    unjudged,
  );
  const ends = leads.flatMap(({ at, value }) =>
    unknownNames('terminal', value.ends, names.terminals, unjudged, `${at}.ends`),
  );
  const chassis = parts.filter(({ value }) => value.kind === 'chassis').length;
  const ids = service.map(({ at, value }) => ({ at, name: value.id }));
  const problems = [
    ...formProblems(input),
    ...repeatedNames('part', named(parts)),
    ...repeatedNames('lead', named(leads)),
    ...partProblems(parts),
    ...(chassis === 1
      ? []
      : [{ path: 'parts', message: `an oven has one chassis, not ${chassis}` }]),
    ...controlProblems(input, parts, unjudged),
    ...ends,
    ...repeatedNames('measurement', ids),
    ...checkService(service, names),
  ];
  const parsed = ovenDefinition.safeParse(input);
  return parsed.success && problems.length === 0
    ? { ok: true, oven: parsed.data }
    : { ok: false, problems };
}
