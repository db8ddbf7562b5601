import type { Page } from 'playwright-core';

/** The bench as hands use it: tools from the dock, targets through the mirror, keys of the meter. */
export interface E2eBench {
  action: (name: string) => Promise<void>;
  /** takes a tool, then taps targets with it */
  uses: (tool: string, ...targets: string[]) => Promise<void>;
  /** opens what can be done at a target and chooses one */
  chooses: (target: string, choice: RegExp | string) => Promise<void>;
  meter: (key: string) => Promise<void>;
  probes: (red: string, black: string) => Promise<void>;
  /** waits for the display, then writes it on the sheet */ writes: (
    display: RegExp,
  ) => Promise<void>;
  display: () => Promise<string>;
  log: (line: RegExp) => Promise<void>;
}

export function benchOn(page: Page): E2eBench {
  const tap = async (target: string): Promise<void> => {
    const button = page.locator(`[data-mirror="${target}"]`);
    await button.focus();
    await button.press('Enter');
  };
  const tool = (name: string) =>
    page.getByRole('toolbar', { name: 'Tools' }).getByRole('button', { name, exact: false });
  const bench: E2eBench = {
    action: (name) => page.getByRole('button', { name, exact: true }).click(),
    uses: async (name, ...targets) => {
      const button = tool(name).first();
      if ((await button.getAttribute('aria-pressed')) !== 'true') await button.click();
      for (const target of targets) await tap(target);
    },
    chooses: async (target, choice) => {
      await tap(target);
      await page
        .getByRole('region', { name: new RegExp(`^${target.replaceAll('.', '\\.')},`) })
        .getByRole('button', { name: choice })
        .first()
        .click();
    },
    meter: (key) => page.getByRole('button', { name: key, exact: true }).first().click(),
    probes: async (red, black) => {
      await bench.uses('red probe', red);
      await page.keyboard.press('Escape');
      await bench.uses('black probe', black);
      await page.keyboard.press('Escape');
    },
    writes: async (display) => {
      await page.waitForFunction(
        ([source]) =>
          new RegExp(source ?? '').test(
            document.querySelector('[data-testid="digits"]')?.textContent ?? '',
          ),
        [display.source],
      );
      await page.getByRole('button', { name: /^Write on job sheet/ }).click();
    },
    display: async () => (await page.getByTestId('digits').first().textContent()) ?? '',
    log: async (line) => {
      await page.getByText(line).first().waitFor();
    },
  };
  return bench;
}
