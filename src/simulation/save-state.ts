/** What the trainee is told about their record. */
export type SaveState =
  | {
      kind: 'saved';
      /** ms since 1970 when the server last stored a step; null: none yet */ at: number | null;
    }
  | { kind: 'saving'; steps: number }
  /** kept on this device, tried again */
  | { kind: 'waiting'; steps: number; why: string; isKept: boolean }
  /** another tab writes now, or the bench is only shown */
  | { kind: 'read-only'; why: string }
  /** the server refuses a step; nothing is thrown away */
  | { kind: 'refused'; steps: number; why: string };

/** The bench takes no more steps in these. */
export const isClosedTo = (
  save: SaveState,
): save is Extract<SaveState, { kind: 'read-only' | 'refused' }> =>
  save.kind === 'read-only' || save.kind === 'refused';
