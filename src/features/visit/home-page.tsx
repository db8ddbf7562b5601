import { ButtonLink } from '../../components/button-link.tsx';
import { CautionPanel } from '../../components/caution-panel.tsx';
import { Page } from '../../components/page.tsx';
import { BenchPicture } from './components/bench-picture.tsx';
import { HowItAnswers } from './components/how-it-answers.tsx';
import { WhatYouDo } from './components/what-you-do.tsx';

export const Component = () => (
  <Page
    title="A virtual test bench for microwave oven repair"
    lead="Take a job ticket, make a faulty oven safe, measure it cold and find the cause, before you open a real one."
  >
    <div className="grid items-start gap-x-10 gap-y-7 lg:grid-cols-[1fr_620px]">
      <div className="grid gap-7">
        <div className="grid justify-items-start gap-2">
          <ButtonLink to="/try" look="main">
            Open a practice job on the bench
          </ButtonLink>
          <p className="text-ink-2">No account needed. You can keep it afterwards by signing up.</p>
        </div>
        <CautionPanel />
      </div>
      <BenchPicture />
    </div>
    <WhatYouDo />
    <HowItAnswers />
  </Page>
);
