import { useMutation } from '@tanstack/react-query';
import { call } from '../../../api/call.ts';
import { startVisit } from '../../../../shared/contracts/attempts.ts';

export const useStartVisit = () => useMutation({ mutationFn: () => call(startVisit, {}) });
