import { learnFrom } from '@/lib/learning';
import { simulatedPool } from '../learning/simulated-pools';
import { inTurn, type Piece } from './piece';

const READINGS = 200;
const histories = [5, 6].map((seed) => simulatedPool(seed, READINGS).history);
const knownBefore = histories.map((history) => ({ history, state: learnFrom(null, history).at(-2)!.state }));

export const learningPieces: readonly Piece[] = [
  {
    name: 'learning from one further reading',
    target: 20,
    run: inTurn(knownBefore, ({ state, history }) => learnFrom(state, history)[0]!.posterior.sigmas.volume),
  },
  {
    name: 'learning from 200 readings',
    target: 1500,
    run: inTurn(histories, (history) => learnFrom(null, history).length),
  },
];
