/** An open switch contact as IEC 60617 draws it: safe when open. */
const Mark = () => (
  <svg
    aria-hidden
    width="30"
    height="18"
    viewBox="0 0 30 18"
    fill="none"
    strokeWidth="2.4"
    strokeLinecap="round"
    className="shrink-0 stroke-ink"
  >
    <path d="M1 13h6M23 13h6M8.8 11.6 20 3.5" />
    <circle cx="8" cy="13" r="1.8" className="fill-act stroke-act" />
    <circle cx="22" cy="13" r="1.8" className="fill-act stroke-act" />
  </svg>
);

export const Brand = () => (
  <span className="flex items-center gap-2 font-mono text-lg font-extrabold tracking-tight text-ink">
    <Mark />
    coldbench
  </span>
);
