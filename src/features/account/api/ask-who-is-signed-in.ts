import { call } from '../../../api/call.ts';
import { whoAmI, type SignedIn } from '../../../../shared/contracts/accounts.ts';

export const askWhoIsSignedIn = async (signal: AbortSignal): Promise<SignedIn | null> =>
  (await call(whoAmI, { signal })).signedIn;
