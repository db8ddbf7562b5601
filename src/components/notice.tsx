import { CircleCheck, Info, OctagonAlert, TriangleAlert } from 'lucide-react';
import type { ReactNode } from 'react';

/** Colours as ISO 3864-1 uses them: yellow caution, red danger, green safe; plain says nothing about safety. */
export type NoticeKind = 'caution' | 'danger' | 'safe' | 'plain';

const kinds = {
  caution: { icon: TriangleAlert, box: 'border-caution bg-caution-tint', sign: 'text-ink' },
  danger: { icon: OctagonAlert, box: 'border-danger bg-danger-tint', sign: 'text-danger' },
  safe: { icon: CircleCheck, box: 'border-safe bg-safe-tint', sign: 'text-safe' },
  plain: { icon: Info, box: 'border-edge bg-sheet', sign: 'text-ink-2' },
} as const;

interface Props {
  kind: NoticeKind;
  title?: string;
  children?: ReactNode;
  /** it appeared because of what the person just did: read it out */ isNews?: boolean;
}

export const Notice = ({ kind, title, children, isNews = false }: Props) => {
  const { icon: Icon, box, sign } = kinds[kind];
  return (
    <div
      role={isNews ? (kind === 'danger' ? 'alert' : 'status') : undefined}
      className={`flex gap-3 rounded-md border border-l-[6px] px-4 py-3 ${box}`}
    >
      <Icon aria-hidden size={20} className={`mt-0.5 shrink-0 ${sign}`} />
      <div className="grid min-w-0 gap-2">
        {title ? <p className="font-bold">{title}</p> : null}
        {children}
      </div>
    </div>
  );
};
