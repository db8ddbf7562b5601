import type { Browser, Page } from 'playwright-core';
import { build } from 'vite';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openBrowser } from '../support/e2e-browser.ts';
import { recordings } from '../support/recordings.ts';
import * as here from '../support/rerun.ts';

let browser: Browser;
let page: Page;

/** The engine and the bench's rules as one script for a browser. */
async function script(): Promise<string> {
  const built = await build({
    configFile: false,
    logLevel: 'error',
    build: {
      write: false,
      lib: { entry: 'tests/support/rerun.ts', formats: ['iife'], name: 'there' },
    },
  });
  const [bundle] = Array.isArray(built) ? built : [built];
  if (!bundle || !('output' in bundle)) throw new Error('nothing was built');
  return bundle.output[0].code;
}

beforeAll(async () => {
  browser = await openBrowser();
  page = await browser.newPage();
  await page.addScriptTag({ content: await script() });
});
afterAll(() => browser.close());

const inTheBrowser = <Name extends keyof typeof here>(
  name: Name,
  args: Parameters<(typeof here)[Name]>,
): Promise<ReturnType<(typeof here)[Name]>> =>
  page.evaluate(
    ([called, given]) => {
      const { there } = globalThis as unknown as {
        there: Record<string, (...all: unknown[]) => never>;
      };
      return there[called]!(...given);
    },
    [name, args] as const,
  );

describe('Node and Chromium', () => {
  it.each(recordings.map((one) => [one.file, one] as const))(
    'make the same of every bit of %s',
    async (_file, { input, events }) => {
      const text = here.rerun(input, events);
      expect(JSON.parse(text)).toMatchObject({ events: { length: events.length } });
      expect(await inTheBrowser('rerun', [input, events])).toBe(text);
    },
  );

  it('run an oven alike, whatever its fault', async () => {
    const { input } = recordings[0]!;
    const faults = [
      { on: 'C1', fault: 'shorted' },
      { on: 'D1', fault: 'shorted' },
      { on: 'D1', fault: 'open' },
      { on: 'V1', fault: 'heater-open' },
      { on: 'V1', fault: 'heater-shorted-to-body' },
      { on: 'V1', fault: 'weak' },
      { on: 'T1', fault: 'shorted-turns' },
    ];
    expect(await inTheBrowser('runsOf', [input, faults])).toEqual(here.runsOf(input, faults));
  });
});
