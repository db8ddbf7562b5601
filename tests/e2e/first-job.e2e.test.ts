import AxeBuilder from '@axe-core/playwright';
import type { Browser, Page } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { benchOn } from '../support/e2e-bench.ts';
import { openBrowser, signIn, visit } from '../support/e2e-browser.ts';
import type { E2eServer } from '../support/e2e-server.ts';
import { startServer } from '../support/e2e-server.ts';

let server: E2eServer;
let browser: Browser;

beforeAll(async () => {
  server = await startServer();
  browser = await openBrowser();
});

afterAll(async () => {
  await browser?.close();
  await server?.stop();
});

const openJob = async (page: Page, title: RegExp): Promise<void> => {
  await page.goto('/jobs');
  await page.getByRole('link', { name: title }).click();
  await page
    .getByRole('button', { name: /start on the bench/i })
    .or(page.getByRole('link', { name: /go on/i }))
    .first()
    .click();
  await page.waitForURL('**/bench/**');
  await page.getByRole('button', { name: 'Pull the cord' }).waitFor();
};

const seriousIn = async (page: Page): Promise<string[]> => {
  const { violations } = await new AxeBuilder({ page }).analyze();
  return violations
    .filter(({ impact }) => impact === 'serious' || impact === 'critical')
    .map(
      ({ id, nodes }) =>
        `${id}: ${nodes
          .map(({ html }) => html)
          .join(' ')
          .slice(0, 300)}`,
    );
};

describe('a trainee', () => {
  it('does a job from ticket to debrief', async () => {
    const { page, errors, context } = await visit(browser, server.url);
    await signIn(page, 'mina@northgate.example');
    await openJob(page, /completely dead/i);
    const bench = benchOn(page);

    await bench.action('Pull the cord');
    await bench.action('Take the cover off');
    await bench.uses('clip of the discharge lead', 'CH.2');
    await bench.uses('tip of the discharge lead', 'C1.1');
    await bench.log(/discharge tip on C1\.1/);
    await bench.uses('tip of the discharge lead', 'C1.2');
    await page.keyboard.press('Escape');

    await bench.meter('200 V DC');
    await bench.probes('BAT.pos', 'BAT.neg');
    await bench.writes(/^12\.[5-7]$/);
    await bench.probes('C1.1', 'C1.2');
    await bench.writes(/^-?0\.0$/);
    await bench.probes('BAT.pos', 'BAT.neg');
    await bench.writes(/^12\.[5-7]$/);

    await bench.chooses('T2.1', /^lift W8/i);
    await bench.meter('2 kΩ');
    await bench.probes('T2.1', 'T2.2');
    await bench.writes(/^OL$/);
    await page.getByLabel('Verdict on Board transformer T2').selectOption('faulty');
    await page.getByLabel('Part or lead').selectOption('T2');
    await page.getByLabel('What is wrong with it').selectOption('primary-open');
    await page.getByRole('button', { name: 'State this cause' }).click();
    await page.getByLabel('What was done').fill('Primary of T2 open. New transformer ordered.');
    await page.getByLabel('What the customer is told').fill('A part is on order.');

    await page
      .getByRole('button', { name: /^hand in/i })
      .first()
      .click();
    await page.getByRole('alertdialog').getByRole('button', { name: 'Hand in' }).click();
    await page.waitForURL('**/attempts/**');
    await page.getByText('You found the cause, and nobody was put at risk.').waitFor();
    await page.getByText('make safe').first().waitFor();
    expect(await seriousIn(page)).toEqual([]);
    expect(errors).toEqual([]);
    await context.close();
  });

  it('runs the oven to confirm the complaint, and the server takes the run', async () => {
    const { page, errors, context } = await visit(browser, server.url);
    await signIn(page, 'mina@northgate.example');
    await openJob(page, /hums louder/i);
    await page.getByRole('button', { name: 'Run the oven' }).click();
    const panel = page.getByRole('region', { name: 'Run the oven' });
    await panel.getByRole('button', { name: 'Run 30 s' }).click();
    await panel.getByText('a loud hum', { exact: true }).waitFor();
    await page.getByText(/saved at/).waitFor();
    await page.reload();
    await page.getByText(/^run: .*a loud hum, water cold/).waitFor();
    expect(errors).toEqual([]);
    await context.close();
  });

  it('goes on where it was after the browser was closed', async () => {
    const first = await visit(browser, server.url);
    await signIn(first.page, 'jonas@northgate.example');
    await openJob(first.page, /hums louder/i);
    await benchOn(first.page).action('Pull the cord');
    await benchOn(first.page).action('Take the cover off');
    await benchOn(first.page).chooses('D1.a', /^lift W27/i);
    await first.page.getByText(/saved at/).waitFor();
    const address = first.page.url();
    await first.context.close();

    const second = await visit(browser, server.url);
    await signIn(second.page, 'jonas@northgate.example');
    await second.page.goto(address);
    await second.page
      .getByText(/W27\/b lifted off D1\.a/)
      .first()
      .waitFor();
    await second.page.getByRole('button', { name: 'Put the cover on' }).waitFor();
    expect(second.errors).toEqual([]);
    await second.context.close();
  });

  it('loses nothing while the database is away for ten seconds', async () => {
    const { page, context } = await visit(browser, server.url);
    await signIn(page, 'tom@northgate.example');
    await openJob(page, /runs quietly/i);
    const bench = benchOn(page);
    await page.getByText(/saved/).first().waitFor();
    await server.admin.query(`ALTER DATABASE ${server.database} ALLOW_CONNECTIONS false`);
    await server.admin.query(
      `SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE datname = '${server.database}'`,
    );
    await bench.action('Pull the cord');
    await page
      .getByText(/not saved: \d+ steps? kept/)
      .first()
      .waitFor();
    await bench.action('Take the cover off');
    await page.waitForTimeout(10_000);
    await server.admin.query(`ALTER DATABASE ${server.database} ALLOW_CONNECTIONS true`);
    await page
      .getByText(/saved at/)
      .first()
      .waitFor({ timeout: 40_000 });
    await page.reload();
    await page
      .getByText(/cover off/)
      .first()
      .waitFor();
    await context.close();
  });
});

describe('an instructor', () => {
  it('opens a replay of an attempt', async () => {
    const { page, errors, context } = await visit(browser, server.url);
    await signIn(page, 'iris@northgate.example');
    await page.goto('/review');
    await page
      .getByRole('row', { name: /Tom Reyes.*handed in/ })
      .getByRole('link')
      .first()
      .click();
    await page.waitForURL('**/attempts/**');
    // The address of a moment brings its replay, wherever it stands on the page.
    await page.goto(`${page.url()}?at=0`);
    await page
      .getByRole('group', { name: 'Replay' })
      .getByRole('button', { name: 'One event on' })
      .click();
    await page.getByRole('slider', { name: 'Moment of the attempt' }).waitFor();
    expect(errors).toEqual([]);
    await context.close();
  });

  it('writes a job by form, tries it and publishes it; a trainee finds it', async () => {
    const { page, errors, context } = await visit(browser, server.url);
    await signIn(page, 'iris@northgate.example');
    await page.goto('/scenarios/new');
    await page.getByLabel('Title').fill('Lamp dark, all else well');
    await page.getByLabel('Symptom').selectOption('heats, lamp, fan or turntable dead');
    await page.getByLabel('Complaint').fill('It heats, but I cannot see my food.');
    await page.getByLabel('Age and use').fill('2 years');
    await page.getByLabel('History').fill('Dropped on the way home.');
    await page.getByLabel('Seen at site').fill('Heats a cup in a minute, lamp dark.');
    const faults = page.getByLabel('Part or lead');
    if ((await faults.count()) === 0)
      await page.getByRole('button', { name: 'Add a fault' }).click();
    await faults.first().selectOption('E1');
    await page.getByLabel('What is wrong').first().selectOption('open');
    await page.getByRole('button', { name: 'Save draft' }).click();
    await page.getByText('Saved as a draft. Not published.').waitFor();
    const address = page.url();
    await page.getByRole('button', { name: 'Try it' }).click();
    await page.waitForURL('**/bench/**');
    await page.getByText('It heats, but I cannot see my food.').first().waitFor();
    await page.goto(address);
    await page.getByRole('button', { name: 'Publish version 1' }).click();
    await page
      .getByRole('alertdialog')
      .getByRole('button', { name: /publish/i })
      .click();
    await page.getByText(/published as version 1/).waitFor();
    expect(errors).toEqual([]);
    await context.close();

    const trainee = await visit(browser, server.url);
    await signIn(trainee.page, 'tom@northgate.example');
    await trainee.page.goto('/jobs');
    await trainee.page.getByRole('link', { name: 'Lamp dark, all else well' }).waitFor();
    await trainee.context.close();
  });
});

describe('an administrator', () => {
  it('sees the people of the organisation and no scenario workshop', async () => {
    const { page, context } = await visit(browser, server.url);
    await signIn(page, 'ada@northgate.example');
    await page.goto('/people');
    await page.getByText('Mina Okafor').waitFor();
    await page.goto('/scenarios');
    await page.getByRole('heading', { name: 'Not for your role' }).waitFor();
    await context.close();
  });
});

describe('a visitor', () => {
  it('does a job with no account and keeps it by signing up', async () => {
    const { page, errors, context } = await visit(browser, server.url);
    await page.goto('/');
    expect(await seriousIn(page)).toEqual([]);
    await page
      .getByRole('link', { name: /practice job/i })
      .first()
      .click();
    await page.waitForURL('**/bench/**');
    const address = page.url();
    await benchOn(page).action('Pull the cord');
    await page.getByText(/saved at/).waitFor();
    expect(await seriousIn(page)).toEqual([]);
    await page.goto('/sign-up');
    await page.getByLabel('Name').fill('Nora Quist');
    await page.getByLabel('E-mail').fill('nora@quist.example');
    await page.getByLabel('Password').fill('a long enough one');
    await page.getByRole('button', { name: /create/i }).click();
    await page.waitForURL('**/attempts/**');
    await page.getByRole('link', { name: 'Go on with your attempt' }).click();
    await page.waitForURL(address);
    await page
      .getByText(/cord out/)
      .first()
      .waitFor();
    expect(errors).toEqual([]);
    await context.close();
  });
});

describe('three sizes', () => {
  it.each([
    [1440, 900],
    [1024, 768],
    [390, 844],
  ])('the bench fits %i x %i without scrolling sideways', async (width, height) => {
    const { page, context } = await visit(browser, server.url, { width, height });
    await page.goto('/try');
    await page.waitForURL('**/bench/**');
    await page.getByRole('button', { name: 'Pull the cord' }).waitFor();
    const overflow = await page.evaluate(
      () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
    );
    expect(overflow).toBe(0);
    await context.close();
  });
});
