import { vi } from 'vitest';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import {
  type PoolProfile,
  type SetupAnswer,
  setupAnswerSchema,
  type SetupState,
  setupSteps,
} from '@/lib/schemas/pool-profile';
import { isVolumeEstimated, waterOf } from '@/lib/schemas/pool-size';
import { scopeOf } from '@/lib/schemas/pool-scope';

const nothing: PoolProfile = {
  scope: null,
  size: null,
  volume: null,
  meanDepth: null,
  volumeEstimated: null,
  lining: null,
  sun: null,
  water: null,
  label: null,
  swimLimitSetBy: null,
};

/** What the routes of pool and shelf answer, kept in memory; every body is checked by the schema of its route. */
export function fakePoolServer(answered: readonly SetupAnswer[] = [], shelf: HouseholdProduct[] = []) {
  const sent: SetupAnswer[] = [];
  let products = shelf;
  let state: SetupState = stateOf(nothing, 'scope');
  const apply = (answer: SetupAnswer) => {
    const place = setupSteps.indexOf(answer.step);
    const reached = state.nextStep === null ? setupSteps.length : setupSteps.indexOf(state.nextStep);
    const next = place === reached ? (setupSteps[place + 1] ?? null) : state.nextStep;
    state = stateOf(profileWith(state.profile, answer), next);
  };
  answered.forEach(apply);

  const answer = vi.fn<typeof fetch>(async (address, options) => {
    const path = String(address);
    const body: unknown = options?.body === undefined ? undefined : JSON.parse(String(options.body));
    if (path === '/api/pool') {
      if (options?.method === 'PUT') {
        const saved = setupAnswerSchema.parse(body);
        sent.push(saved);
        apply(saved);
      }
      return Response.json(state);
    }
    if (path === '/api/shelf-products' && options?.method === 'POST') {
      const product = body as HouseholdProduct;
      products = [...products.filter(({ id }) => id !== product.id), product];
      return Response.json(product);
    }
    if (path === '/api/shelf-products') return Response.json(products);
    if (path === '/api/households') return Response.json({ done: true });
    return Response.json({ error: { code: 'not-found', message: path, problems: [] } }, { status: 404 });
  });
  vi.stubGlobal('fetch', answer);
  return { sent, answer, shelf: () => products };
}

function stateOf(profile: PoolProfile, nextStep: SetupState['nextStep']): SetupState {
  const decision = scopeOf(profile.scope, profile.volume);
  return {
    nextStep,
    completed: nextStep === null && decision.result !== 'stop',
    recordOnly: decision.result !== 'ok',
    decision,
    profile,
  };
}

function profileWith(profile: PoolProfile, answer: SetupAnswer): PoolProfile {
  if (answer.step === 'shelf') return profile;
  if (answer.step !== 'size') return { ...profile, [answer.step]: answer.answers };
  const { volume, meanDepth } = waterOf(answer.answers);
  return {
    ...profile,
    size: answer.answers,
    volume,
    meanDepth: meanDepth ?? null,
    volumeEstimated: isVolumeEstimated(answer.answers),
  };
}
