import { useBench } from '../../simulation/bench-context.ts';
import { annunciators } from './annunciators.ts';
import { CaptureButton } from './capture-button.tsx';
import { Keys } from './keys.tsx';
import { Lcd } from './lcd.tsx';
import { ProbeLine } from './probe-line.tsx';

export const LiveLcd = ({ isSmall = false }: { isSmall?: boolean }) => {
  const meter = useBench(({ setup }) => setup.meter);
  const state = useBench((store) => store.state);
  const view = useBench((store) => store.view);
  const isConnected = state.probes.red !== null && state.probes.black !== null;
  const reading = view?.reading;
  return (
    <Lcd
      marks={annunciators(meter, state, view, isConnected)}
      display={reading?.display ?? ''}
      unit={reading?.unit ?? ''}
      isWarning={reading?.isWarning ?? false}
      isSmall={isSmall}
    />
  );
};

/** The meter on the dock, with what is under its tips. */
export const Meter = () => {
  const name = useBench(({ setup }) => setup.meter.name);
  return (
    <section
      aria-label={name}
      className="grid w-[470px] shrink-0 grid-cols-[196px_1fr] gap-3 rounded-[14px] border-t border-edge bg-bench-line p-3 shadow-lg"
    >
      <div className="grid min-w-0 grid-rows-[1fr_auto] gap-1.5">
        <LiveLcd />
        <div className="grid gap-0.5">
          <ProbeLine probe="red" />
          <ProbeLine probe="black" />
        </div>
      </div>
      <div className="grid content-between gap-1">
        <Keys className="grid grid-cols-6 gap-1" />
        <CaptureButton />
      </div>
    </section>
  );
};
