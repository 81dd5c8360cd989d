import type { SetupStep } from '@/lib/schemas/pool-profile';
import type { PoolPlace } from './setting';

export function addressOf(step: SetupStep, place: PoolPlace): string {
  return place === 'profile' ? `/pool/${step}` : `/first-run/${step}`;
}
