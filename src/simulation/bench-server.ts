import type { RecordedEvent, WireEvent } from '../../shared/bench/event.ts';
import { getAttempt, getEvents, takeOver, type Attempt } from '../../shared/contracts/attempts.ts';
import { getOven } from '../../shared/contracts/ovens.ts';
import type { OvenLayout } from '../../shared/oven/layout.ts';
import type { OvenDefinition } from '../../shared/oven/oven.ts';
import { call } from '../api/call.ts';
import type { Sent } from './step-queue.ts';
import { sendSteps } from './send-steps.ts';

/** What the bench needs of the server. Each rejects with a Problem, but for `send`: there every answer is a value. */
export interface BenchServer {
  attempt: (id: string) => Promise<Attempt>;
  events: (id: string) => Promise<RecordedEvent[]>;
  oven: (id: string) => Promise<{ definition: OvenDefinition; layout: OvenLayout }>;
  takeOver: (id: string, writer: string) => Promise<{ epoch: number; next: number }>;
  send: (
    id: string,
    writer: string,
    epoch: number,
  ) => (from: number, events: readonly WireEvent[]) => Promise<Sent>;
}

export const benchServer: BenchServer = {
  attempt: async (attempt) => (await call(getAttempt, { params: { attempt } })).attempt,
  events: async (attempt) => (await call(getEvents, { params: { attempt } })).events,
  oven: (oven) => call(getOven, { params: { oven } }),
  takeOver: (attempt, writer) => call(takeOver, { params: { attempt }, body: { writer } }),
  send: sendSteps,
};
