import { settingOf } from '../../../shared/instruments/meters.ts';
import type { OvenDefinition } from '../../../shared/oven/oven.ts';
import { partKinds } from '../../../shared/oven/parts/catalogue.ts';
import { useBench } from '../../simulation/bench-context.ts';
import { expectedText } from './expected-text.ts';
import { PanelSection } from './panel-section.tsx';

/** What a hand does to this part for the measurement. */
const handOn = ({ parts }: OvenDefinition, ref: string): string => {
  const kind = parts.find((part) => part.ref === ref)?.kind;
  return (kind && partKinds[kind].actuator?.inShort) ?? 'press';
};

/** The maker's figures: where to measure, and what a good part gives. */
export const ServiceData = () => {
  const definition = useBench(({ setup }) => setup.oven.definition);
  const meter = useBench(({ setup }) => setup.meter);
  return (
    <PanelSection title="Service data">
      <table className="w-full border-collapse text-sm">
        <thead className="sr-only">
          <tr>
            <th scope="col">Measurement</th>
            <th scope="col">A good part gives</th>
          </tr>
        </thead>
        <tbody>
          {definition.serviceData.map((one) => (
            <tr key={one.id} className="border-b border-line align-top">
              <th scope="row" className="py-1.5 pr-2 text-left font-normal">
                {one.label}
                <span className="block font-mono text-xs text-ink-2">
                  {one.between.join(' – ')}
                  {one.lift.length > 0 ? `, lift ${one.lift.join(' ')}` : ''}
                  {one.clean?.length ? `, clean ${one.clean.join(' ')}` : ''}
                  {(one.press ?? []).map((ref) => `, ${handOn(definition, ref)} ${ref}`).join('')}
                </span>
              </th>
              <td className="py-1.5 text-right font-mono text-xs leading-5 font-semibold whitespace-nowrap">
                {expectedText(one)}
                <span className="sr-only">
                  , on {settingOf(meter, one.setting)?.name ?? one.setting}
                </span>
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </PanelSection>
  );
};
