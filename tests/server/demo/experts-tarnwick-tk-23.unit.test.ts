import { loadOven } from '../../oven/oven-on-bench.ts';
import { checkExperts } from '../../support/check-experts.ts';

checkExperts(loadOven('tarnwick-tk-23'));
