import { useQueryClient } from '@tanstack/react-query';
import { useForm, type Resolver } from 'react-hook-form';
import type { ScenarioContent } from '../../../../shared/scenario/scenario.ts';
import { ovenQuery } from '../../ovens/api/oven-query.ts';
import { draftResolver } from '../draft-resolver.ts';

/** The form of a draft, checked against the oven it names at that moment; without the oven only by the schema. */
export const useDraftForm = (start: ScenarioContent) => {
  const queries = useQueryClient();
  const resolver: Resolver<ScenarioContent> = (draft, context, options) => {
    const oven = queries.getQueryData(ovenQuery(draft.oven).queryKey);
    return draftResolver(oven?.definition)(draft, context, options);
  };
  return useForm<ScenarioContent>({ defaultValues: start, resolver });
};
