import { useMemo } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { CauseEditor } from './cause-editor.tsx';
import { Checklist } from './checklist.tsx';
import { PanelSection } from './panel-section.tsx';
import { PartRow } from './part-row.tsx';
import { readingsByPart } from './readings-by-part.ts';
import { ReportFields } from './report-fields.tsx';

/** Readings and verdicts by part, cause, report, and what is still open. */
export const JobSheet = () => {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const state = useBench((store) => store.state);
  const readings = useMemo(() => readingsByPart(state), [state]);
  const parts = definition.parts.filter(({ kind }) => kind !== 'chassis');
  const loose = [...(readings.get('') ?? []), ...(readings.get('CH') ?? [])];
  return (
    <div className="grid content-start gap-5">
      <PanelSection
        title="Job sheet"
        aside={<span className="text-xs text-ink-2">C writes the reading here</span>}
      >
        <ul>
          {parts.map((part) => (
            <PartRow key={part.ref} part={part} readings={readings.get(part.ref) ?? []} />
          ))}
        </ul>
        {loose.length > 0 ? (
          <p className="font-mono text-xs text-ink-2">
            Of no part:{' '}
            {loose.map((one) => `${one.red} – ${one.black} ${one.display} ${one.unit}`).join('; ')}
          </p>
        ) : null}
      </PanelSection>
      <CauseEditor />
      <ReportFields />
      <Checklist />
    </div>
  );
};
