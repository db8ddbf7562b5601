import { X } from 'lucide-react';

export const IconX = ({ name, onPress }: { name: string; onPress: () => void }) => (
  <button
    type="button"
    aria-label={name}
    onClick={onPress}
    className="flex size-7 shrink-0 items-center justify-center rounded border border-transparent hover:border-current"
  >
    <X aria-hidden size={16} />
  </button>
);
