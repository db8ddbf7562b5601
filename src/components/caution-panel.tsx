import { Notice } from './notice.tsx';

const cautions = [
  'This is practice on a simulated oven. It does not qualify you to open a real one.',
  'A real microwave oven can kill with the plug out: its high-voltage capacitor may stay charged.',
  'High-voltage work belongs to trained people, licensed where your country requires it. Never measure high voltage live.',
  "Local codes and the maker's service information come first.",
  'The limit for microwave leakage, and who may certify it, depend on the country.',
];

/** The usual cautions; on every public page, ticket and debrief. */
export const CautionPanel = () => (
  <section aria-label="Cautions">
    <Notice kind="caution" title="Before you open a real oven">
      <ul className="grid list-disc gap-1 pl-5 text-sm">
        {cautions.map((caution) => (
          <li key={caution}>{caution}</li>
        ))}
      </ul>
    </Notice>
  </section>
);
