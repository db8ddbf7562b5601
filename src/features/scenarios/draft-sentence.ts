import type { z } from 'zod';

/** A mistake in a draft as a sentence to stand beside its field. */
export const draftSentence = (issue: z.core.$ZodRawIssue): string => {
  if (issue.code === 'too_small')
    return issue.origin === 'string' ? 'Fill this in.' : `At least ${issue.minimum}.`;
  if (issue.code === 'too_big') {
    if (issue.origin === 'string') return `Keep it to ${issue.maximum} characters.`;
    return issue.origin === 'array'
      ? `At most ${issue.maximum} in one scenario.`
      : `At most ${issue.maximum}.`;
  }
  if (issue.code === 'invalid_type' && issue.expected === 'number') return 'Enter a number.';
  return 'Choose one of the list.';
};
