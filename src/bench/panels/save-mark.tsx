import { CircleCheck, CloudOff, Loader, Lock, OctagonAlert } from 'lucide-react';
import { useBench } from '../../simulation/bench-context.ts';
import { saveText } from './save-text.ts';

const signs = {
  saved: { icon: CircleCheck, tone: 'text-ink-2', sign: 'text-safe' },
  saving: { icon: Loader, tone: 'text-ink-2', sign: 'text-ink-2' },
  waiting: { icon: CloudOff, tone: 'rounded bg-caution px-1.5 text-on-caution', sign: '' },
  'read-only': { icon: Lock, tone: 'text-ink-2', sign: 'text-ink-2' },
  refused: { icon: OctagonAlert, tone: 'text-danger font-semibold', sign: 'text-danger' },
} as const;

/** Where the record stands, as true as this tab knows it. */
export const SaveMark = ({ onRetry }: { onRetry: () => void }) => {
  const save = useBench((store) => store.save);
  const { icon: Icon, tone, sign } = signs[save.kind];
  return (
    <span className="flex items-center gap-2">
      <span
        title={'why' in save ? save.why : undefined}
        className={`flex items-center gap-1.5 text-sm leading-tight ${tone}`}
      >
        <Icon aria-hidden size={15} className={`shrink-0 ${sign}`} />
        {saveText(save)}
      </span>
      {save.kind === 'waiting' ? (
        <button
          type="button"
          onClick={onRetry}
          className="min-h-6 text-sm font-semibold whitespace-nowrap text-act underline underline-offset-2"
        >
          Try again
        </button>
      ) : null}
    </span>
  );
};
