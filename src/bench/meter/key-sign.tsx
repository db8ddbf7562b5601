/** IEC 60417 signs where a word is too long or the type has no sign: diode, sound, direct and alternating voltage. */
const signs: Readonly<Record<string, string>> = {
  diode: 'M1 7h6M13 7h6M7 2v10l6-5zM13 2v10',
  'V⎓': 'M1 2l4 10 4-10M12.5 5.5h7M12.5 9h1.6M15.2 9h1.6M17.9 9h1.6',
  'V~': 'M1 2l4 10 4-10M12.5 8q1.7-4 3.5 0t3.5 0',
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
