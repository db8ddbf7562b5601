/** IEC 60417 signs for what a word is too long for: the diode check, and the sound of the continuity check. */
const signs: Readonly<Record<string, string>> = {
  diode: 'M1 7h6M13 7h6M7 2v10l6-5zM13 2v10',
  beep: 'M2 5v4h3l4 3V2L5 5zM12 4.5a4 4 0 0 1 0 5M14.5 2.5a7 7 0 0 1 0 9',
};

export const KeySign = ({ label }: { label: string }) => {
  const path = signs[label];
  if (path === undefined) return <>{label}</>;
  return (
    <svg
      aria-hidden
      width="20"
      height="14"
      viewBox="0 0 20 14"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.6"
      strokeLinecap="round"
      strokeLinejoin="round"
    >
      <path d={path} />
    </svg>
  );
};
