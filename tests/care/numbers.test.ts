import { describe, expect, it } from 'vitest';
import { bucketLitres } from '@/components/week-sheet/dose-state';
import type { Constant } from '@/lib/client/worked-out/constant';
import { constantGroups } from '@/lib/client/worked-out/constants';
import { undoWindow } from '@/lib/services/sheet-doses';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { handling } from '@/lib/standards/handling';
import { everySentence, type Sentence } from './words';

/** Pages whose numbers somebody acts on. */
const namespaces = [
  'situations',
  'doses',
  'verdict',
  'events',
  'help',
  'house',
  'readings',
  'rounds',
  'week',
  'learnt',
];

const inWords: Record<string, number> = {
  ...{ 'a third': 1 / 3, half: 0.5, two: 2, three: 3, four: 4, seven: 7, ten: 10, fifteen: 15 },
};
const nouns = 'minutes?|hours?|h|days?|weeks?|evenings?|mornings?|cm|mg/L|per cent|L|g|of the depth|of 100|in 10|tests';
const number = new RegExp(
  `(?:(?<![\\w#{.,])(\\d+(?:\\.\\d+)?)|\\b(a third|half|two|three|four|seven|ten|fifteen))[ -](?:(?:treatment|good|morning) )?(${nouns})\\b|pH .*?(\\d\\.\\d) to (\\d\\.\\d)`,
  'gi',
);

type Figure = { at: string; said: string; value: number };

/** The figures in a message: a number with what it counts; the keys and the values of its arguments are none. */
function figuresIn({ at, text }: Sentence): Figure[] {
  const plain = text.replace(/<\/?\w+>/g, '');
  return [...plain.matchAll(number)].flatMap(([said, digits, word, , low, high]): Figure[] => {
    if (low !== undefined && high !== undefined)
      return [low, high].map((value) => ({ at, said, value: Number(value) }));
    return [{ at, said, value: digits === undefined ? (inWords[(word ?? '').toLowerCase()] ?? NaN) : Number(digits) }];
  });
}

const figures = everySentence.filter(({ at }) => namespaces.includes(at.split(':')[0] ?? '')).flatMap(figuresIn);

const rule = (name: string) => `standards/${name}`;
const of = {
  rinse: rule('handling#handling.rinse.value'),
  thunder: rule('handling#handling.thunder.value'),
  diarrhoea: rule('handling#handling.diarrhoea.value'),
  airing: rule('handling#handling.airing.value'),
  openAfterDose: rule('handling#handling.openAfterDose.value'),
  alone: rule('handling#handling.longestAlone.value'),
  pumpAllDay: rule('handling#handling.pumpWhileClearing.value'),
  undo: rule('handling#handling.undo.value'),
  sample: rule('handling#handling.sampleAfterDose.value'),
  feeder: rule('caps#swimWaitHours.trichlor'),
  maximum: rule('situations#clearingRules.freeChlorine'),
  evenings: rule('situations#clearingRules.evenings'),
  mornings: rule('situations#clearingRules.mornings'),
  apart: rule('situations#clearingRules.hoursBetweenTests'),
  thirdOfDepth: rule('situations#replacedAtMost.value'),
  accident: rule('situations#accidentTime.minutes'),
  combined: rule('situations#combinedRules.evenings'),
  acidApart: rule('limits#limits.acidToChlorineGap.value'),
  rangeLow: rule('limits#limits.pHRangeLow.value'),
  pHFirst: rule('situations#clearingRules.pH'),
  planAge: rule('limits#limits.planReadingAge.value'),
  exchange: rule('companions#waterExchangeADay.value'),
  volumeReach: 'learning/posterior-of#VOLUME_REACH',
};

/** Which listed constant each figure is, and how many of the said unit its own unit holds. */
const listedAs: readonly [at: RegExp, of: string, times?: number][] = [
  [/^help: emergency\.(eyes|skin|ground)|^house: sheet\.trouble\.eyes/, of.rinse],
  [/^doses: (after\.tablets|steps\.tablets-inline\.6)/, of.feeder, 60],
  [/^doses: may$/, of.undo],
  [/^doses: reason\.treatment-evening/, of.maximum],
  [/^verdict: standing|^events: kind\.storm|^help: safety\.swim\.three|^house: sheet\.daily\.swim/, of.thunder],
  [/^situations: (caution\.thunder|step\.thunder-over)/, of.thunder],
  [/^help: safety\.ground/, of.thunder, 1 / 60],
  [/^help: safety\.(swim\.four|ground)|^situations: caution\.nobody-ill-swims/, of.diarrhoea, 1 / 7],
  [/^events: kind\.cover-off|^situations: (kind\.cover|caution\.half-open-cover|branch\.air-and-test)/, of.airing],
  [/^situations: step\.(air-cover|cover-off-clean)/, of.airing],
  [/^situations: branch\.air-first/, of.openAfterDose],
  [/^house: away\.week|^situations: (kind\.away\.hint|answer\.nobody|branch\.alone)/, of.alone],
  [/^situations: step\.pump-day-and-night/, of.pumpAllDay],
  [/^readings: sample/, of.sample],
  [/^situations: (branch\.published-time|done\.thirty-minutes)/, of.accident],
  [/^situations: (kind\.clearing\.lasts|call\.four-evenings)/, of.evenings],
  [/^situations: (about\.combined-chlorine|call\.three-evenings|kind\.combined-chlorine)/, of.combined],
  [/^situations: (headlineLead\.out-clearing|done\.two-mornings)/, of.mornings],
  [/^situations: (headlineLead\.out-settling|branch\.settling|caution\.nobody-in-cloudy|done\.)/, of.apart],
  [/^situations: (caution\.shell-can-float|reason\.water-in-rounds)/, of.thirdOfDepth],
  [/^situations: caution\.acid-alone/, of.acidApart],
  [/^situations: reason\.pH-first/, of.rangeLow],
  [/^situations: reason\.pH-first/, of.pHFirst],
  [/^week: state\.needOld/, of.planAge],
  [/^week: why\.reason\.replace-water-first/, of.exchange, 100],
  [/^learnt: (words\.volumeDiffers|measureAgain)/, of.volumeReach, 100],
];

/** Figures that set nobody a limit: how many there are of something, how long a list takes, a share of what is shown. */
const noLimits: readonly [at: RegExp, said: string, why: string][] = [
  [/^situations: kind\.(accident|away)\.lasts/, '', 'how long it takes'],
  [/^situations: kind\.(stabilizer-high|hardness-high)\.lasts/, '', 'how long it takes'],
  [/^situations: kind\.(opening|closing)\.lasts/, '', 'how long it takes'],
  [/^situations: (headlineLead\.out-settling|branch\.settling)/, 'Two tests', 'counted: one after the other'],
  [/^rounds: title/, '', 'how long it takes'],
  [/^learnt: /, '', 'weeks of learning, listed in its own group'],
  [/^week: why\.reason\.fast-closes-gap/, '', 'how many doses the plan has'],
];

const listed = new Map<string, Constant>(
  constantGroups.flatMap((group): [string, Constant][] =>
    group.constants.map((constant: Constant) => [constant.of, constant]),
  ),
);

const isListed = ({ at }: Figure) => listedAs.some(([place]) => place.test(at));
const isNoLimit = (figure: Figure) =>
  noLimits.some(
    ([place, words]) => place.test(figure.at) && (words === '' ? !isListed(figure) : figure.said.includes(words)),
  );
const thatLimit = figures.filter((figure) => !isNoLimit(figure));

describe('every number in the care texts', () => {
  it('is found', () => {
    expect(figures.length).toBeGreaterThan(40);
    expect(figures.map(({ said }) => said)).toEqual(
      expect.arrayContaining(['15 minutes', '12 hours', '10 mg/L', '15 cm']),
    );
  });

  it.each(thatLimit.map((figure) => [`${figure.at}: ${figure.said}`, figure] as const))('%s', (_, figure) => {
    const values = listedAs
      .filter(([place]) => place.test(figure.at))
      .map(([, constant, times = 1]) => (listed.get(constant)?.value ?? NaN) * times);
    expect(values.map((value) => Math.round(value * 1e6) / 1e6)).toContain(Math.round(figure.value * 1e6) / 1e6);
  });

  it('would be seen in a new sentence', () => {
    const [planted] = figuresIn({ at: 'situations: planted', text: 'Back in after 45 minutes.' });
    expect(planted).toMatchObject({ said: '45 minutes', value: 45 });
    expect(isListed(planted!) || isNoLimit(planted!)).toBe(false);
  });

  it('names a listed constant, with the kind of its source', () => {
    for (const [place, constant] of listedAs) {
      expect(listed.has(constant), `${constant} of ${place}`).toBe(true);
      expect(
        figures.some(({ at }) => place.test(at)),
        String(place),
      ).toBe(true);
    }
  });

  it('has no place that nobody says any more among those that set no limit', () => {
    for (const [place, words] of noLimits)
      expect(
        figures.filter(isNoLimit).some(({ at, said }) => place.test(at) && said.includes(words)),
        String(place),
      ).toBe(true);
  });

  it('is the number that the program works with', () => {
    expect(undoWindow).toBe(handling.undo.value * 60_000);
    const bucket = (amount: number, substance: PlanDose['substance']) =>
      bucketLitres({ amount, substance } as PlanDose);
    const { bucketWater, granulesInBucket, calciumInBucket } = handling;
    for (const [most, substance] of [
      [granulesInBucket.value, 'calcium-hypochlorite'],
      [calciumInBucket.value, 'calcium-chloride'],
    ] as const)
      expect([bucket(most, substance), bucket(most + 1, substance)]).toEqual([
        bucketWater.value,
        2 * bucketWater.value,
      ]);
  });
});
