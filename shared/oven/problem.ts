import { nearestName } from './nearest-name.ts';

/** One mistake in a definition: where (`leads.4.ends.0`) and what, in a sentence. */
export interface Problem {
  path: string;
  message: string;
}

/** "unknown terminal C1.3; did you mean C1.1?" */
export function unknownName(
  what: string,
  wrong: string,
  known: readonly string[],
  path: string,
): Problem {
  const near = nearestName(wrong, known);
  const hint = near === null ? '' : `; did you mean ${near}?`;
  return { path, message: `unknown ${what} ${wrong}${hint}` };
}

/** One problem for each name of a list that is neither known nor of an entry whose own form is wrong. */
export function unknownNames(
  what: string,
  names: readonly string[],
  known: readonly string[],
  unjudged: readonly string[],
  path: string,
): Problem[] {
  return names.flatMap((name, index) =>
    known.includes(name) || unjudged.includes(name.split(/[./]/)[0] ?? name)
      ? []
      : [unknownName(what, name, known, `${path}.${index}`)],
  );
}

/** One problem for each name that was there before. */
export function repeatedNames(
  what: string,
  entries: readonly { at: string; name: string }[],
): Problem[] {
  return entries.flatMap(({ at, name }, index) => {
    const first = entries.findIndex((entry) => entry.name === name);
    return first === index
      ? []
      : [{ path: at, message: `${what} ${name} is there already at ${entries[first]?.at}` }];
  });
}
