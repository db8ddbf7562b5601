import { useState } from 'react';
import { Button } from '../../components/button.tsx';
import { useBench } from '../../simulation/bench-context.ts';
import { Modal } from './modal.tsx';
import { useOpenPoints } from './use-open-points.ts';

/** Hands the job sheet in, after saying what is still open. */
export const HandIn = ({ onHandedIn }: { onHandedIn: () => void }) => {
  const run = useBench((store) => store.run);
  const isHandedIn = useBench(({ state }) => state.isHandedIn);
  const open = useOpenPoints().filter(({ isDone }) => !isDone);
  const [isAsking, setIsAsking] = useState(false);
  const confirm = (): void => {
    setIsAsking(false);
    if (run({ type: 'HandIn', data: {} })) onHandedIn();
  };
  return (
    <>
      <Button look="main" isSmall disabled={isHandedIn} onClick={() => setIsAsking(true)}>
        <span>
          Hand in<span className="max-[700px]:sr-only"> job sheet</span>
        </span>
      </Button>
      <Modal
        isOpen={isAsking}
        isAlert
        title="Hand in the job sheet?"
        onClose={() => setIsAsking(false)}
      >
        {open.length === 0 ? (
          <p>
            Everything on the list is done. After this the bench is closed and the debrief opens.
          </p>
        ) : (
          <div className="grid gap-3">
            <p>Still open. You can hand in all the same; after this the bench is closed.</p>
            <ul className="grid list-disc gap-1 pl-5">
              {open.map(({ id, open: what }) => (
                <li key={id}>{what}</li>
              ))}
            </ul>
          </div>
        )}
        <div className="flex flex-wrap justify-end gap-3">
          <Button onClick={() => setIsAsking(false)}>Back to the bench</Button>
          <Button look="main" onClick={confirm}>
            Hand in
          </Button>
        </div>
      </Modal>
    </>
  );
};
