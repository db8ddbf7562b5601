import { OctagonAlert, TriangleAlert } from 'lucide-react';
import { hazard } from '../../../shared/bench/record.ts';
import { useBench } from '../../simulation/bench-context.ts';
import { hazardWords, type HazardData } from './hazard-words.ts';
import { BenchButton } from './bench-button.tsx';
import { IconX } from './icon-x.tsx';

const Row = ({ label, text }: { label: string; text: string }) => (
  <div className="grid grid-cols-[76px_1fr] gap-2">
    <dt className="font-semibold">{label}</dt>
    <dd>{text}</dd>
  </div>
);

const HazardPanel = ({ data, onClose }: { data: HazardData; onClose: () => void }) => {
  const isGuided = useBench(({ condition }) => condition === 'guided');
  const isOffered = useBench(({ state }) => state.wayBack?.isOffered === true);
  const run = useBench((store) => store.run);
  const words = hazardWords(data);
  return (
    <section
      aria-label="Hazard"
      className="pointer-events-auto grid min-h-0 w-full max-w-[520px] gap-2.5 overflow-y-auto rounded-lg border-2 border-danger-lamp bg-mat-deep p-4 text-bench-ink shadow-xl"
    >
      <p className="flex items-center gap-2 text-lg font-bold">
        <OctagonAlert aria-hidden size={22} className="shrink-0 text-danger-lamp" />
        {words.title}
      </p>
      <p>{words.happened}</p>
      <dl className="grid gap-1.5 text-sm">
        <Row label="On you" text={words.person} />
        <Row label="The meter" text={words.meter} />
        {isGuided ? <Row label="First" text={words.first} /> : null}
      </dl>
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p className="text-sm text-bench-ink-2">
          {isOffered
            ? 'Step back, and the bench is as it was before this. It stays in the record.'
            : 'This is in the record.'}
        </p>
        <div className="ml-auto flex gap-2">
          {isOffered ? (
            <BenchButton
              isMain
              aria-keyshortcuts="u"
              onClick={() => run({ type: 'StepBack', data: {} })}
            >
              Step back
            </BenchButton>
          ) : null}
          <BenchButton isMain={!isOffered} onClick={onClose}>
            Go on
          </BenchButton>
        </div>
      </div>
    </section>
  );
};

/** What just happened, in plain words; it stays until the trainee goes on. */
export const HazardNotice = () => {
  const notice = useBench((store) => store.notice);
  const dismiss = useBench((store) => store.dismiss);
  if (notice?.kind !== 'hazard') return null;
  const parsed = hazard.safeParse(notice.event.data);
  return parsed.success ? <HazardPanel data={parsed.data} onClose={dismiss} /> : null;
};

/** Why not, in one sentence. */
export const RefusalNotice = () => {
  const notice = useBench((store) => store.notice);
  const dismiss = useBench((store) => store.dismiss);
  if (notice?.kind !== 'refusal') return null;
  return (
    <div className="pointer-events-auto flex max-w-full items-center gap-2 rounded-md border border-caution bg-mat-deep py-1 pr-1 pl-3 leading-snug text-bench-ink shadow-lg">
      <TriangleAlert aria-hidden size={18} className="shrink-0 text-caution" />
      <p className="text-sm">{notice.text}</p>
      <IconX name="Close this note" onPress={dismiss} />
    </div>
  );
};
