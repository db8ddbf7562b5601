import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { ConfirmDialog } from '../../components/confirm-dialog.tsx';
import { useBench } from '../../simulation/bench-context.ts';
import { useOpenPoints } from './use-open-points.ts';

/** Hands the job sheet in, after saying what is still open. */
export const HandIn = ({ onHandedIn }: { onHandedIn: () => void }) => {
  const run = useBench((store) => store.run);
  const isHandedIn = useBench(({ state }) => state.isHandedIn);
  const open = useOpenPoints().filter(({ isDone }) => !isDone);
  const [isAsking, setIsAsking] = useState(false);
  return (
    <>
      <Button look="main" isSmall disabled={isHandedIn} onClick={() => setIsAsking(true)}>
        <span>
          Hand in<span className="max-[700px]:sr-only"> job sheet</span>
        </span>
      </Button>
      <ConfirmDialog
        isOpen={isAsking}
        title="Hand in the job sheet?"
        confirm="Hand in"
        cancel="Back to the bench"
        onCancel={() => setIsAsking(false)}
        onConfirm={() => {
          setIsAsking(false);
          if (run({ type: 'HandIn', data: {} })) onHandedIn();
        }}
      >
        {open.length === 0 ? (
          <p>
            Everything on the list is done. After this the bench is closed and the debrief opens.
          </p>
        ) : (
          <>
            <p>Still open. You can hand in all the same; after this the bench is closed.</p>
            <ul className="grid list-disc gap-1 pl-5">
              {open.map(({ id, open: what }) => (
                <li key={id}>{what}</li>
              ))}
            </ul>
          </>
        )}
      </ConfirmDialog>
    </>
  );
};
