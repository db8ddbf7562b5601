import { Check, Square } from 'lucide-react';
import { PanelSection } from './panel-section.tsx';
import { useOpenPoints } from './use-open-points.ts';

/** What belongs done before the sheet is handed in. */
export const Checklist = () => {
  const points = useOpenPoints();
  return (
    <PanelSection title="Before you hand in">
      <ul className="grid grid-cols-2 gap-x-2 gap-y-1 text-sm">
        {points.map(({ id, text, isDone }) => (
          <li key={id} className="flex items-start gap-1.5">
            {isDone ? (
              <Check aria-hidden size={16} className="mt-0.5 shrink-0 text-safe" />
            ) : (
              <Square aria-hidden size={16} className="mt-0.5 shrink-0 text-ink-2" />
            )}
            <span>
              {text}
              <span className="sr-only">{isDone ? ', done' : ', open'}</span>
            </span>
          </li>
        ))}
      </ul>
    </PanelSection>
  );
};
