import type { ReactNode } from 'react';
import { useBench } from '../../simulation/bench-context.ts';
import { HoldChoice } from './hold-choice.tsx';
import { ToolButton } from './tool-button.tsx';

const Card = ({ title, more, children }: { title: string; more?: string; children: ReactNode }) => (
  <div
    role="group"
    aria-label={title}
    className="grid min-w-0 content-start gap-1 rounded-lg border border-bench-line bg-mat p-1.5"
  >
    <p
      aria-hidden
      className="flex justify-between gap-1 truncate text-xs font-semibold text-bench-ink"
    >
      {title}
      {more ? <span className="font-mono font-normal text-bench-ink-2">{more}</span> : null}
    </p>
    {children}
  </div>
);

const Dot = ({ probe }: { probe: 'red' | 'black' }) => (
  <span
    aria-hidden
    className={`size-2.5 shrink-0 rounded-full border border-bench-ink-2 ${probe === 'red' ? 'bg-probe-red' : 'bg-probe-black'}`}
  />
);

const useConnected = () => {
  const discharge = useBench(({ state }) => state.discharge);
  const battery = useBench(({ state }) => state.battery);
  return { discharge, battery };
};

const ProbeTool = ({ probe, shortcut }: { probe: 'red' | 'black'; shortcut: string }) => {
  const target = useBench(({ state }) => state.probes[probe]);
  return (
    <ToolButton hand={{ kind: 'probe', probe }} target={target} shortcut={shortcut}>
      <Dot probe={probe} /> {target === null ? probe : ''}
    </ToolButton>
  );
};

const ProbeTools = () => (
  <>
    <ProbeTool probe="red" shortcut="r" />
    <ProbeTool probe="black" shortcut="b" />
  </>
);

const HoldChoices = () => (
  <>
    {(['red', 'black'] as const).map((probe) => (
      <span key={probe} className="flex min-w-0 items-center gap-0.5">
        <Dot probe={probe} />
        <HoldChoice probe={probe} />
      </span>
    ))}
  </>
);

const DischargeTools = () => {
  const { discharge } = useConnected();
  return (
    <>
      <ToolButton hand={{ kind: 'discharge-clip' }} target={discharge.clip} shortcut="d">
        clip
      </ToolButton>
      <ToolButton hand={{ kind: 'discharge-tip' }} target={discharge.tip} shortcut="d">
        tip
      </ToolButton>
    </>
  );
};

const BatteryTools = () => {
  const { battery } = useConnected();
  return (
    <>
      <ToolButton hand={{ kind: 'battery-clip', clip: 'neg' }} target={battery.neg}>
        −
      </ToolButton>
      <ToolButton hand={{ kind: 'battery-clip', clip: 'oneK' }} target={battery.oneK}>
        + 1 kΩ
      </ToolButton>
    </>
  );
};

/** Everything a hand can take, each with where it sits. */
export const ToolCards = () => {
  const labels = useBench(({ state }) => Object.keys(state.labels).length);
  return (
    <div
      role="toolbar"
      aria-label="Tools"
      className="grid min-w-0 grow grid-cols-3 content-between gap-1.5"
    >
      <Card title="Probes">
        <ProbeTools />
      </Card>
      <Card title="Discharge lead">
        <DischargeTools />
      </Card>
      <Card title="Battery 12.6 V">
        <BatteryTools />
      </Card>
      <div className="col-span-3 grid min-w-0 grid-cols-[1.25fr_1fr] gap-1.5">
        <Card title="Tips held by">
          <div className="grid grid-cols-2 gap-1">
            <HoldChoices />
          </div>
        </Card>
        <Card title="Labels, pad, blade" more={`${labels}`}>
          <div className="grid grid-cols-3 gap-0.5">
            <ToolButton hand={{ kind: 'label' }}>label</ToolButton>
            <ToolButton hand={{ kind: 'pad' }}>pad</ToolButton>
            <ToolButton hand={{ kind: 'screwdriver', from: null }}>blade</ToolButton>
          </div>
        </Card>
      </div>
    </div>
  );
};

const RowGroup = ({ title, children }: { title: string; children: ReactNode }) => (
  <div role="group" aria-label={title || 'More tools'} className="flex shrink-0 items-center gap-1">
    <span aria-hidden className="text-xs text-bench-ink-2">
      {title}
    </span>
    {children}
  </div>
);

/** The same in one row that scrolls, for a small screen. */
export const ToolRow = () => (
  <div
    role="toolbar"
    aria-label="Tools"
    className="flex gap-3 overflow-x-auto pb-0.5 [&_button]:h-8"
  >
    <RowGroup title="Probes">
      <ProbeTools />
    </RowGroup>
    <RowGroup title="Held by">
      <HoldChoices />
    </RowGroup>
    <RowGroup title="Discharge">
      <DischargeTools />
    </RowGroup>
    <RowGroup title="Battery">
      <BatteryTools />
    </RowGroup>
    <RowGroup title="">
      <ToolButton hand={{ kind: 'label' }}>labels</ToolButton>
      <ToolButton hand={{ kind: 'pad' }}>pad</ToolButton>
      <ToolButton hand={{ kind: 'screwdriver', from: null }}>screwdriver</ToolButton>
    </RowGroup>
  </div>
);
