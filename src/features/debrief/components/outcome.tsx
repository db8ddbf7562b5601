import type { Debrief } from '../../../../shared/assessment/debrief.ts';
import { Badge } from '../../../components/badge.tsx';

/** The one sentence the debrief leads with, the score and the two things that matter most. */
export const Outcome = ({ debrief }: { debrief: Debrief }) => (
  <section aria-label="Outcome" className="grid gap-3 border-l-[6px] border-edge pl-5">
    <p className="max-w-[60ch] text-xl leading-snug font-semibold">{debrief.outcome}</p>
    <div className="flex flex-wrap items-center gap-3">
      <p className="font-mono text-2xl font-extrabold">
        {Math.round(debrief.score)}
        <span className="text-sm font-normal text-ink-2"> of 100</span>
      </p>
      <Badge kind={debrief.isCauseFound ? 'safe' : 'plain'}>
        {debrief.isCauseFound ? 'cause found' : 'cause not found'}
      </Badge>
      <Badge kind={debrief.isSafe ? 'safe' : 'danger'}>
        {debrief.isSafe ? 'worked safely' : 'not worked safely'}
      </Badge>
    </div>
  </section>
);
