import { ChevronLeft, ClipboardList, Tag } from 'lucide-react';
import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import type { Attempt } from '../../../shared/contracts/attempts.ts';
import { Brand } from '../../components/brand.tsx';
import { BenchTime } from './bench-time.tsx';
import { SaveMark } from './save-mark.tsx';

export type DrawerName = 'left' | 'right';

interface Props {
  attempt: Attempt;
  open: DrawerName | null;
  onOpen: (drawer: DrawerName | null) => void;
  onRetry: () => void;
  /** the button that hands in */ children: ReactNode;
}

const conditions = {
  guided: 'Guided practice',
  unaided: 'Unaided practice',
  assessed: 'Assessed',
} as const;

const drawerClasses =
  'flex min-h-8 items-center gap-1.5 rounded-md border border-edge px-2 text-sm font-semibold text-act aria-expanded:bg-act-tint min-[1100px]:hidden';

export const BenchHeader = ({ attempt, open, onOpen, onRetry, children }: Props) => {
  const toggle = (drawer: DrawerName): void => onOpen(open === drawer ? null : drawer);
  return (
    <header className="flex items-center gap-3 border-b border-line bg-sheet px-4 max-[700px]:gap-2 max-[700px]:px-2">
      <Link
        to={attempt.scenario ? `/jobs/${attempt.scenario}` : '/'}
        aria-label="Coldbench, leave the bench"
        className="rounded"
      >
        <span className="max-[700px]:hidden">
          <Brand />
        </span>
        <ChevronLeft aria-hidden size={22} className="min-[700px]:hidden" />
      </Link>
      <span aria-hidden className="text-edge max-[1100px]:hidden">
        /
      </span>
      <h1 className="truncate text-base max-[900px]:sr-only">
        <b className="font-semibold">Job {String(attempt.number).padStart(4, '0')}</b>{' '}
        <span className="max-[1250px]:sr-only">{attempt.title}</span>
      </h1>
      <span className="ml-auto" />
      <span className="flex items-center gap-3 max-[700px]:grid max-[700px]:gap-0">
        <BenchTime />
        <span className="rounded-full border border-line px-2.5 py-0.5 font-mono text-xs font-semibold whitespace-nowrap max-[1200px]:hidden">
          {conditions[attempt.content.condition]}
        </span>
        <SaveMark onRetry={onRetry} />
      </span>
      <button
        type="button"
        aria-expanded={open === 'left'}
        onClick={() => toggle('left')}
        className={drawerClasses}
      >
        <Tag aria-hidden size={16} />
        <span className="max-[700px]:sr-only">Ticket</span>
      </button>
      <button
        type="button"
        aria-expanded={open === 'right'}
        onClick={() => toggle('right')}
        className={drawerClasses}
      >
        <ClipboardList aria-hidden size={16} />
        <span className="max-[700px]:sr-only">Job sheet</span>
      </button>
      {children}
    </header>
  );
};
