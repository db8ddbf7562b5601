import { TriangleAlert } from 'lucide-react';
import { useState, type ReactNode } from 'react';
import { Button } from '../../components/button.tsx';
import { useBench } from '../../simulation/bench-context.ts';

interface Props {
  /** why steps made here earlier are not on the bench */ setAside: string | null;
  onContinueHere: () => void;
  onSetAside: () => void;
  onRetry: () => void;
}

const Banner = ({ children, action }: { children: ReactNode; action: ReactNode }) => (
  <div
    role="status"
    className="flex flex-wrap items-center gap-x-4 gap-y-2 border-b border-line bg-caution-tint px-4 py-2 text-ink"
  >
    <TriangleAlert aria-hidden size={18} className="shrink-0" />
    <p className="min-w-[200px] flex-1 text-sm">{children}</p>
    {action}
  </div>
);

/** What has to be known about the record before going on. */
export const RecordBanner = ({ setAside, onContinueHere, onSetAside, onRetry }: Props) => {
  const save = useBench((store) => store.save);
  const isHandedIn = useBench(({ state }) => state.isHandedIn);
  const [isRead, setIsRead] = useState(false);
  if (save.kind === 'read-only')
    return (
      <Banner
        action={
          <Button isSmall onClick={onContinueHere}>
            Continue here
          </Button>
        }
      >
        {save.why} Here you can only read.
      </Banner>
    );
  if (save.kind === 'refused')
    return (
      <Banner
        action={
          <Button isSmall onClick={onSetAside}>
            Set them aside and go on
          </Button>
        }
      >
        The record does not take what you did here last: {save.why} Nothing is lost: {save.steps}{' '}
        {save.steps === 1 ? 'step is' : 'steps are'} kept on this device. The bench takes no more
        steps until you set them aside.
      </Banner>
    );
  if (isHandedIn)
    return (
      <Banner
        action={
          save.kind === 'waiting' ? (
            <Button isSmall onClick={onRetry}>
              Try again
            </Button>
          ) : null
        }
      >
        Your job sheet is handed in on this device. The debrief opens as soon as the server has it.
      </Banner>
    );
  if (setAside !== null && !isRead)
    return (
      <Banner
        action={
          <Button isSmall onClick={() => setIsRead(true)}>
            Go on
          </Button>
        }
      >
        Steps kept on this device are not on the bench. {setAside} They were set aside.
      </Banner>
    );
  return null;
};
