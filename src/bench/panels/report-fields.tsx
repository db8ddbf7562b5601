import { useState } from 'react';
import { TextArea } from '../../components/text-area.tsx';
import { useBench } from '../../simulation/bench-context.ts';
import { PanelSection } from './panel-section.tsx';

/** The two texts of the report; each is recorded when the trainee leaves the field. */
export const ReportFields = () => {
  const report = useBench(({ state }) => state.sheet.report);
  const run = useBench((store) => store.run);
  const [repair, setRepair] = useState(report.repair);
  const [customer, setCustomer] = useState(report.customer);
  const write = (): void => {
    if (repair !== report.repair || customer !== report.customer)
      run({ type: 'WriteReport', data: { repair, customer } });
  };
  return (
    <PanelSection title="Report">
      <TextArea
        label="What was done"
        maxLength={2000}
        value={repair}
        onChange={(event) => setRepair(event.target.value)}
        onBlur={write}
      />
      <TextArea
        label="What the customer is told"
        maxLength={2000}
        value={customer}
        onChange={(event) => setCustomer(event.target.value)}
        onBlur={write}
      />
    </PanelSection>
  );
};
