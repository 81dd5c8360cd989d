import type { Scope, ScopeAnswers, scopeNotes, scopeReasons } from './pool-profile';

type Reason = (typeof scopeReasons)[number];
type Note = (typeof scopeNotes)[number];

/** Below the first nothing is kept going, below the second nothing is planned [m3] (care rules, part 1). */
const emptiedDaily = 2;
const tooSmallToPlan = 10;

/**
 * What the answers mean: whether Wadewell plans for this pool, only keeps its record, or is not for it.
 *
 * @param answers the scope questions; null while they are open, which is no reason to stop
 * @param volume [m3]; null while it is open
 */
export function scopeOf(answers: ScopeAnswers | null, volume: number | null): Scope {
  const stops: Reason[] = [];
  const recordOnly: Reason[] = [];
  if (answers) {
    const { system, kind } = answers;
    if (system === 'unknown') stops.push('unknown-system');
    else if (system === 'salt-generator') recordOnly.push(system);
    else if (system !== 'chlorine') stops.push(system);
    if (kind === 'hot-tub') stops.push('hot-tub');
    if (answers.roofed) stops.push('roofed');
    if (answers.newSurface) stops.push('new-surface');
    if (answers.openToPublic) stops.push('open-to-public');
    if (answers.planted) stops.push('planted');
  }
  if (volume !== null && volume < emptiedDaily) stops.push('under-2-cubic-metres');
  else if (volume !== null && volume < tooSmallToPlan) recordOnly.push('under-10-cubic-metres');

  const result = stops.length > 0 ? 'stop' : recordOnly.length > 0 ? 'record-only' : 'ok';
  return { result, reasons: [...stops, ...recordOnly], notes: notesOf(answers) };
}

function notesOf(answers: ScopeAnswers | null): Note[] {
  return [
    ...(answers?.kind === 'pool-with-spa' ? (['spa-counts-in-volume'] as const) : []),
    ...(answers?.wellWater ? (['metal-test-first'] as const) : []),
  ];
}
