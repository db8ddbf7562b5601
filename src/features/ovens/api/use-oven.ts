import { useQuery } from '@tanstack/react-query';
import { ovenQuery } from './oven-query.ts';

export const useOven = (oven: string) => useQuery(ovenQuery(oven));
