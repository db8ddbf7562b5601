import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { render, screen } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { expect, it, vi } from 'vitest';
import type { Attempt } from '../../shared/contracts/attempts.ts';
import type { StepCurve } from '../../shared/reasoning/step-curve.ts';
import { Narrowing } from '../../src/features/debrief/components/narrowing.tsx';
import { lc28 } from '../support/bench.ts';

const curve: StepCurve = {
  start: 325,
  steps: [
    {
      sequence: 12,
      benchMs: 125_000,
      reading: {
        red: 'F1.1',
        black: 'F1.2',
        setting: 'beep',
        display: 'OL',
        unit: 'Ω',
        value: null,
        isSettled: true,
        isBeeping: false,
        isRelative: false,
      },
      left: 94,
      bits: 1.8,
      best: { label: 'Diode, red on cathode', bits: 2.1, seconds: 23, left: 41.4 },
    },
  ],
};

vi.mock('../../src/simulation/ask-reasoning.ts', () => ({
  canReason: () => true,
  askReasoning: async () => curve,
}));

const attempt = { id: 'a', content: { meter: 'manual-2000' } } as Attempt;

it('says what each reading left beside the best measurement then, and leads to the moment', async () => {
  const goTo = vi.fn();
  render(
    <QueryClientProvider client={new QueryClient()}>
      <Narrowing attempt={attempt} definition={lc28} events={[]} goTo={goTo} />
    </QueryClientProvider>,
  );
  const summary = await screen.findByText('The same as a table');
  await userEvent.click(summary);
  const row = screen.getByRole('row', { name: /F1\.1–F1\.2 OL/ });
  expect(row).toHaveTextContent('02:05');
  expect(row).toHaveTextContent('94');
  expect(row).toHaveTextContent('Diode, red on cathode');
  expect(row).toHaveTextContent('41');
  await userEvent.click(screen.getByRole('button', { name: '02:05' }));
  expect(goTo).toHaveBeenCalledWith(12);
});
