import { useEffect, useRef, type ReactNode } from 'react';
import { IconX } from './icon-x.tsx';

interface Props {
  side: 'left' | 'right';
  name: string;
  /** below 1100 px it is a drawer */ isOpen: boolean;
  onClose: () => void;
  children: ReactNode;
}

const sides = {
  left: 'bg-paper border-r max-[1099px]:left-0',
  right: 'bg-sheet border-l max-[1099px]:right-0',
} as const;

/** A column beside the bench; on a smaller screen a drawer over it. */
export const SideColumn = ({ side, name, isOpen, onClose, children }: Props) => {
  const column = useRef<HTMLElement>(null);
  useEffect(() => {
    if (isOpen) column.current?.focus({ preventScroll: true });
  }, [isOpen]);
  return (
    <aside
      ref={column}
      tabIndex={-1}
      aria-label={name}
      onKeyDown={(event) => {
        if (event.key === 'Escape' && isOpen) onClose();
      }}
      className={`relative min-h-0 overflow-y-auto border-line p-4 outline-none ${sides[side]} ${
        isOpen
          ? 'max-[1099px]:fixed max-[1099px]:top-[52px] max-[1099px]:bottom-0 max-[1099px]:z-10 max-[1099px]:w-[340px] max-[1099px]:max-w-full max-[1099px]:shadow-xl'
          : 'max-[1099px]:hidden'
      }`}
    >
      <div className="flex justify-end min-[1100px]:hidden">
        <IconX name={`Close: ${name}`} onPress={onClose} />
      </div>
      {children}
    </aside>
  );
};
