import type { BenchCommand } from './catalogue.ts';
import { openingSeconds, surveySeconds } from './actions/safety-checks.ts';

/** Commands whose event stands at the end of a run of the oven. */
export type LastingCommand = Extract<
  BenchCommand,
  { type: 'RunOven' | 'SurveyLeakage' | 'CheckInterlocks' }
>;

/** s of bench time that it takes */
export function lastsSeconds(command: LastingCommand): number {
  switch (command.type) {
    case 'RunOven':
      return command.data.ordered;
    case 'SurveyLeakage':
      return surveySeconds;
    case 'CheckInterlocks':
      return openingSeconds;
  }
}
