import type { Membership } from '../http/caller.ts';

export interface Account {
  id: string;
  name: string;
  email: string;
  passwordHash: string;
}

export interface NewAccount {
  name: string;
  /** in lower case */ email: string;
  passwordHash: string;
  /** of the organisation that is the person's own */ organisation: string;
  /** hash of the visitor token whose attempts become theirs */ visitor: string | null;
  at: Date;
}

export type Created =
  | {
      kind: 'created';
      person: string;
      organisation: string;
      /** the visitor's newest attempt */ keptAttempt: string | null;
    }
  | { kind: 'email-taken' };

export interface AccountStore {
  findByEmail: (email: string) => Promise<Account | null>;
  /** the oldest first */
  membershipsOf: (person: string) => Promise<Membership[]>;
  /** person, own organisation and kept attempts, all or nothing */
  create: (account: NewAccount) => Promise<Created>;
}

export interface OpenSession {
  /** the secret that the cookie carries */ id: string;
  person: { id: string; name: string; email: string };
  organisation: string;
  /** the cookie must be sent again: the session lasts longer now */ isRenewed: boolean;
}

export interface SessionStore {
  open: (person: string, organisation: string) => Promise<string>;
  /** null: unknown or expired */
  read: (id: string) => Promise<OpenSession | null>;
  workIn: (id: string, organisation: string) => Promise<void>;
  close: (id: string) => Promise<void>;
  deleteExpired: () => Promise<void>;
}
