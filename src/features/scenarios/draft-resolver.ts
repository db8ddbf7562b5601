import { toNestErrors } from '@hookform/resolvers';
import type { FieldError, Resolver } from 'react-hook-form';
import { checkFaults } from '../../../shared/oven/check-faults.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { scenarioContent, type ScenarioContent } from '../../../shared/scenario/scenario.ts';
import { draftSentence } from './draft-sentence.ts';

interface Found {
  path: string;
  message: string;
}

const missing = (draft: ScenarioContent): Found[] =>
  draft.faults.flatMap(({ on, fault }, index) => [
    ...(on === '' ? [{ path: `faults.${index}.on`, message: 'Choose a part or a lead.' }] : []),
    ...(fault === ''
      ? [{ path: `faults.${index}.fault`, message: 'Choose what is wrong with it.' }]
      : []),
  ]);

const unfit = (definition: OvenDefinition, draft: ScenarioContent): Found[] => {
  const faults = draft.faults.filter(({ on, fault }) => on !== '' && fault !== '');
  return checkFaults(definition, faults).map(({ path, message }) => ({
    // Counted among the filled ones above; the form counts all of them.
    path: path.replace(/^faults\.(\d+)/, (_, index: string) => {
      const fault = faults[Number(index)];
      return `faults.${fault ? draft.faults.indexOf(fault) : index}`;
    }),
    message: `${message.charAt(0).toUpperCase()}${message.slice(1)}.`,
  }));
};

/**
 * Checks a draft as the server will: by the schema, and its faults against the oven they are in. All
 * mistakes at once, each at its field; the first found at a field is the one shown.
 */
export const draftResolver =
  (definition: OvenDefinition | undefined): Resolver<ScenarioContent> =>
  (draft, _context, options) => {
    const parsed = scenarioContent.safeParse(draft, { error: draftSentence });
    const found = [
      ...missing(draft),
      ...(parsed.error?.issues.map(({ path, message }) => ({ path: path.join('.'), message })) ??
        []),
      ...(definition ? unfit(definition, draft) : []),
    ];
    if (parsed.success && found.length === 0) return { values: parsed.data, errors: {} };
    const errors: Record<string, FieldError> = {};
    for (const { path, message } of found) errors[path] ??= { type: 'draft', message };
    return { values: {}, errors: toNestErrors<ScenarioContent>(errors, options) };
  };
