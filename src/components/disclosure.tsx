import { ChevronDown } from 'lucide-react';
import { useEffect, useId, useRef, useState, type ReactNode } from 'react';

interface Props {
  label: ReactNode;
  className?: string;
  /** links and buttons; using one closes it */ children: ReactNode;
}

/** A button that opens a short list below it; Escape, a click elsewhere or leaving it closes it. */
export const Disclosure = ({ label, className = '', children }: Props) => {
  const [isOpen, setIsOpen] = useState(false);
  const id = useId();
  const root = useRef<HTMLDivElement>(null);
  const button = useRef<HTMLButtonElement>(null);

  useEffect(() => {
    if (!isOpen) return undefined;
    const closeOutside = (event: Event): void => {
      if (!root.current?.contains(event.target as Node)) setIsOpen(false);
    };
    document.addEventListener('pointerdown', closeOutside);
    document.addEventListener('focusin', closeOutside);
    return () => {
      document.removeEventListener('pointerdown', closeOutside);
      document.removeEventListener('focusin', closeOutside);
    };
  }, [isOpen]);

  return (
    <div
      ref={root}
      className={`relative ${className}`}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || !isOpen) return;
        setIsOpen(false);
        button.current?.focus();
      }}
    >
      <button
        ref={button}
        type="button"
        aria-expanded={isOpen}
        aria-controls={id}
        onClick={() => setIsOpen(!isOpen)}
        className="flex min-h-9 max-w-[220px] items-center gap-1.5 rounded-md border border-transparent px-2 font-semibold hover:bg-act-tint"
      >
        <span className="truncate">{label}</span>
        <ChevronDown aria-hidden size={16} className="shrink-0 text-ink-2" />
      </button>
      {isOpen ? (
        <div
          id={id}
          onClick={() => setIsOpen(false)}
          className="absolute top-full right-0 z-10 mt-1 grid w-max max-w-[calc(100vw-32px)] min-w-[220px] gap-0.5 rounded-md border border-edge bg-sheet p-1.5 shadow-lg"
        >
          {children}
        </div>
      ) : null}
    </div>
  );
};
