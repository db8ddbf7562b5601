import { useEffect, useRef, useState, type CSSProperties } from 'react';
import type { BenchCommand } from '../../../shared/bench/catalogue.ts';
import { useBench, useBenchApi } from '../../simulation/bench-context.ts';
import { IconX } from './icon-x.tsx';
import { LabelForm } from './label-form.tsx';
import { lookAtPart } from './look-at-part.ts';
import { choicesFor, type Choice } from './selection-choices.ts';

const Look = ({ part }: { part: string }) => {
  const found = useBench(({ setup, state }) =>
    state.inspected.includes(part)
      ? lookAtPart(setup.oven.definition, state, part).join('\n')
      : null,
  );
  if (found === null) return null;
  const looks = found === '' ? ['Nothing unusual to see.'] : found.split('\n');
  return (
    <div className="rounded border border-bench-line bg-mat px-2.5 py-1.5 text-sm">
      {looks.map((look) => (
        <p key={look}>{look}</p>
      ))}
    </div>
  );
};

/** A tool is where it goes, the hand free for the next thing; a lead or part is seldom done with after one. */
const isPlacing = ({ type }: BenchCommand): boolean => /Probe|Discharge|Battery/.test(type);

const isShort = (choice: Choice): choice is Extract<Choice, { kind: 'command' }> =>
  choice.kind === 'command' && choice.short !== undefined;

const buttonClasses =
  'flex min-h-8 w-full items-center rounded border border-bench-line px-2.5 py-1 text-left text-sm font-semibold hover:border-bench-ink-2 hover:bg-mat';

interface Props {
  /** where it stands on the mat */ style: CSSProperties;
  /** the keyboard goes back where it came from */ onClose: () => void;
}

/** Beside what is picked out: its name and what can be done with it. */
export const SelectionPanel = ({ style, onClose }: Props) => {
  const bench = useBenchApi();
  const selection = useBench((store) => store.selection);
  const state = useBench((store) => store.state);
  const definition = useBench(({ setup }) => setup.oven.definition);
  const [labelling, setLabelling] = useState<{ end: string; text: string } | null>(null);
  const panel = useRef<HTMLElement>(null);
  const key = selection && `${selection.kind} ${selection.ref}`;

  useEffect(() => panel.current?.focus({ preventScroll: true }), [key]);

  const choices = selection && choicesFor(definition, state, selection);
  if (!selection || !choices) return null;
  const choose = (choice: Choice): void => {
    const { run, take, select } = bench.getState();
    switch (choice.kind) {
      case 'command':
        if (run(choice.command) && isPlacing(choice.command)) onClose();
        return;
      case 'take':
        return take(choice.hand);
      case 'label':
        return setLabelling(choice);
      case 'go':
        return select(choice.to);
    }
  };
  return (
    <section
      ref={panel}
      tabIndex={-1}
      aria-label={`${choices.ref}, ${choices.name}`}
      style={style}
      className="absolute z-[5] grid content-start gap-2.5 overflow-y-auto rounded-lg border border-bench-ink-2 bg-mat-deep p-3 text-bench-ink shadow-xl outline-none"
    >
      <div className="flex items-start justify-between gap-2">
        <p className="grid">
          <span className="font-mono text-sm font-semibold text-caution">{choices.ref}</span>
          <span className="text-sm">{choices.name}</span>
        </p>
        <IconX name="Close" onPress={onClose} />
      </div>
      {selection.kind === 'part' ? <Look part={selection.ref} /> : null}
      {labelling ? (
        <LabelForm
          key={labelling.end}
          end={labelling.end}
          text={labelling.text}
          onDone={() => setLabelling(null)}
        />
      ) : (
        choices.groups.map(({ title, choices: here }) => (
          <div
            key={title}
            role="group"
            aria-label={title}
            className={`grid gap-1 ${here.some(isShort) ? 'grid-cols-2' : ''}`}
          >
            <p aria-hidden className="col-span-full text-xs text-bench-ink-2">
              {title}
            </p>
            {here.map((choice) => (
              <button
                key={choice.label}
                type="button"
                aria-label={choice.label}
                className={buttonClasses}
                onClick={() => choose(choice)}
              >
                {isShort(choice) ? choice.short : choice.label}
              </button>
            ))}
          </div>
        ))
      )}
    </section>
  );
};
