import { useBench } from '../../simulation/bench-context.ts';
import { keyGroups, type KeyGroup } from './key-groups.ts';
import { KeySign } from './key-sign.tsx';
import { MeterKey } from './meter-key.tsx';

const Group = ({ group }: { group: KeyGroup }) => {
  const setting = useBench(({ state }) => state.meter.setting);
  const run = useBench((store) => store.run);
  return (
    <div role="group" aria-label={group.name} className="contents">
      {group.legend === '' ? null : (
        <span
          aria-hidden
          className="flex h-[26px] items-center justify-center font-mono text-xs font-semibold text-bench-ink-2"
        >
          <KeySign label={group.legend} />
        </span>
      )}
      {group.keys.map((key) => (
        <MeterKey
          key={key.setting}
          name={key.name}
          isOn={key.holds.includes(setting)}
          onPress={() => {
            if (!key.holds.includes(setting))
              run({ type: 'SetMeter', data: { setting: key.setting } });
          }}
        >
          <KeySign label={key.label} />
        </MeterKey>
      ))}
    </div>
  );
};

const RelKey = () => {
  const isOn = useBench(({ state }) => state.meter.relative !== null);
  const run = useBench((store) => store.run);
  return (
    <MeterKey
      name="REL, subtract what the display shows now"
      isOn={isOn}
      onPress={() => run({ type: isOn ? 'ClearRelative' : 'SetRelative', data: {} })}
    >
      REL
    </MeterKey>
  );
};

const OffKey = () => {
  const isOn = useBench(({ state }) => state.meter.setting === 'off');
  const run = useBench((store) => store.run);
  return (
    <MeterKey
      name="meter off"
      isOn={isOn}
      onPress={() => {
        if (!isOn) run({ type: 'SetMeter', data: { setting: 'off' } });
      }}
    >
      off
    </MeterKey>
  );
};

/** All keys in a grid, grouped ohms, checks, volts, then REL and off. */
export const Keys = ({ className }: { className: string }) => {
  const meter = useBench(({ setup }) => setup.meter);
  return (
    <div role="group" aria-label="Meter keys" className={className}>
      {keyGroups(meter).map((group) => (
        <Group key={group.id} group={group} />
      ))}
      <RelKey />
      <OffKey />
    </div>
  );
};
