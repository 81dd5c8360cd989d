import { describe, expect, it } from 'vitest';
import doses from '@/lib/messages/en/doses.json';
import { branches, type StepCode } from '@/lib/situations/codes';
import { everySituation, everyWay } from './every-way';
import { everySentence, said } from './words';

const figures = { hours: 4, litres: '15 L', after: 'Nobody in until the morning.', heats: 'yes', name: 'none' };
const cardText = (card: string) =>
  ['1', '2', '3', '4', '5', '6'].map((step) => said(`doses: steps.${card}.${step}`, figures)).join(' ');
/** Where the first of some words stands; far behind everything where none does. */
const place = (text: string, words: RegExp) => {
  const at = text.search(words);
  return at < 0 ? Infinity : at;
};

const pours = /\b(then the (granules|product|dry acid)|[Pp]our|[Ss]catter|[Hh]ang the bag)\b/;
const poured = [
  'granules-dissolve',
  'granules-broadcast',
  'liquid',
  'acid',
  'dry-acid',
  'companion-dissolve',
  'stabilizer-bag',
] as const;
const loaded = ['tablets-inline', 'tablets-floating'] as const;
/** No way of adding: care rules, part 4, give none by default. */
const labelFirst = 'granules-label-first';

describe('the six steps of a dose', () => {
  it('are those of one of the kinds below', () => {
    expect(Object.keys(doses.steps).toSorted()).toEqual([...poured, ...loaded, labelFirst].toSorted());
  });

  it('of a label that nobody has read: no way of adding it, and none to try', () => {
    const steps = doses.steps[labelFirst];
    expect(Object.keys(steps)).toEqual(['1', '2', '3']);
    expect(steps[1]).toMatch(/^<b>Do not add it yet\.<\/b>/);
    const text = Object.values(steps).join(' ');
    // What a label may say is named in its own words, as the question for it is.
    expect(text.replace('dissolve first, pour straight in, or only through its feeder', '')).not.toMatch(pours);
    expect(text).not.toMatch(/\bTick\b|[Bb]ucket|[Ss]coop/);
    expect(text).toMatch(/Where the label does not say, nothing of it goes in\.$/);
  });

  it.each(poured)('%s: nobody in, then goggles and gloves, then the pump, then pouring, then the tick', (card) => {
    const text = cardText(card);
    const nobody = place(text, /Nobody in the water, children and pets indoors/);
    const goggles = place(text, /[Gg]oggles.{0,25}gloves/);
    const pump = place(text, /Pump on now; leave it on 4 hours/);
    const pouring = place(text, pours);
    expect([nobody, goggles, pump, pouring]).not.toContain(Infinity);
    expect(Math.max(nobody, goggles)).toBeLessThan(pump);
    expect(pump).toBeLessThan(pouring);
    expect(pouring).toBeLessThan(place(text, /\bTick\./));
    expect(text.trim()).toMatch(/Nobody in until the morning/);
  });

  it.each(poured.filter((card) => card !== 'stabilizer-bag'))(
    '%s: what it was poured with is rinsed, or wiped dry, and locked away',
    (card) => {
      const text = cardText(card);
      const cleaned = place(text, /Rinse the (bucket|jug) in the pool|Rinse the outside|[Ss]coop wiped dry/);
      expect(cleaned).toBeGreaterThan(place(text, pours));
      expect(place(text, /locked away/)).toBeGreaterThan(cleaned);
      expect(place(text, /locked away/)).toBeLessThan(place(text, /\bTick\./));
    },
  );

  it('a feeder: nobody in, pump off, goggles and gloves, then open slowly, same tablets, close, pump on, 15 minutes', () => {
    const text = cardText('tablets-inline');
    const order = [
      /Nobody in the water/,
      /Pump off/,
      /Goggles, gloves/,
      /Face away, open slowly and let the gas clear/,
      /The same tablets as before only/,
      /Never break or crush one/,
      /Close/,
      /Pump on, look for drips/,
      /Nobody in until it has run 15 minutes/,
    ].map((words) => place(text, words));
    expect(order).not.toContain(Infinity);
    expect(order).toEqual(order.toSorted((a, b) => a - b));
  });

  it('a floater: nobody in, goggles and gloves, its own tray, then open slowly, same tablets, close, tied', () => {
    const text = cardText('tablets-floating');
    const order = [
      /Nobody in the water/,
      /Goggles, gloves/,
      /in its own plastic tray/,
      /open slowly and let the gas clear/,
      /The same tablets as before only/,
      /Never break or crush one/,
      /tie it clear of steps and walls/,
    ].map((words) => place(text, words));
    expect(order).not.toContain(Infinity);
    expect(order).toEqual(order.toSorted((a, b) => a - b));
    expect(text).toMatch(/While anyone swims the floater is out, in its tray, out of reach/);
  });

  it('water is in the bucket before the product', () => {
    for (const card of ['granules-dissolve', 'dry-acid', 'companion-dissolve'])
      expect(cardText(card)).toMatch(/[Ww]ater (of|in) .*bucket.*, then the (granules|product|dry acid)/);
  });
});

describe('every sentence that speaks of the pump and of pouring', () => {
  const protects = /nobody in\b|everyone out|goggles|gloves/i;
  const pumpOn = /\bpump on\b/i;
  const pouring = /\bpour\b|\bthen the granules\b|\bthen pour\b/i;
  const both = everySentence.filter(({ text }) => pumpOn.test(text) && (protects.test(text) || pouring.test(text)));

  it('is found', () => {
    expect(both.map(({ at }) => at)).toEqual(
      expect.arrayContaining(['situations: step.dose.note', 'situations: caution.liquid-low.text']),
    );
  });

  it.each(both.map(({ at, text }) => [at, text]))('%s', (_, text) => {
    if (protects.test(text)) expect(text.search(protects)).toBeLessThan(text.search(pumpOn));
    if (pouring.test(text)) expect(text.search(pumpOn)).toBeLessThan(text.search(pouring));
  });

  it('the safety card: label, nobody in, goggles and gloves, pump, in this order', () => {
    const before = ['one', 'two', 'three', 'four'].map((step) => said(`help: safety.before.${step}`));
    const wanted = [
      /^Read the label/,
      /^Nobody in the water/,
      /^Goggles and chemical gloves on/,
      /^Pump on before you pour/,
    ];
    for (const [index, words] of wanted.entries()) expect(before[index]).toMatch(words);
  });
});

/** What a step is for, where its order matters; everything else looks, tests, cleans or locks. */
const people: readonly StepCode[] = ['everyone-out', 'thunder-over', 'electrician', 'ask-before-lowering'];
const pump: readonly StepCode[] = ['pump-off', 'pump-day-and-night', 'filter-running', 'filter-and-pump'];
const pouring: readonly StepCode[] = ['dose', 'dose-before-leaving', 'balance-before-closing'];
/** Steps at which somebody works a switch or opens what the pump drives. */
const switches: readonly StepCode[] = ['baskets', 'earth-leakage-test', 'clean-filter'];

describe('every situation, in every water', () => {
  const shown = everyWay();
  const of = (kinds: readonly string[]) => shown.filter(({ situation }) => kinds.includes(situation.kind));
  const placesOf = (codes: readonly string[], list: readonly StepCode[]) =>
    codes.flatMap((code, index) => (list.includes(code as StepCode) ? [index] : []));
  const ordered = (first: readonly number[], then: readonly number[]) =>
    first.length === 0 || then.length === 0 || Math.max(...first) < Math.min(...then);

  it('is walked through on each of its ways', () => {
    expect(everySituation.length).toBeGreaterThan(30);
    for (const [kind, ways] of Object.entries(branches)) {
      const walked = new Set(of([kind]).map(({ way }) => way.branch));
      expect([...walked].toSorted(), kind).toEqual([...ways].toSorted());
    }
  });

  it('sees to people before the pump, and to the pump before anything is poured', () => {
    const wrong = shown.filter(({ procedure: { steps } }) => {
      const codes = steps.map(({ code }) => code);
      const [protect, run, pour] = [people, pump, pouring].map((list) => placesOf(codes, list));
      return !(ordered(protect!, run!) && ordered(protect!, pour!) && ordered(run!, pour!));
    });
    expect(wrong.map(({ name }) => name)).toEqual([]);
  });

  it('would be seen in the wrong order', () => {
    const codes = ['dose', 'pump-day-and-night', 'everyone-out'];
    expect(ordered(placesOf(codes, people), placesOf(codes, pump))).toBe(false);
    expect(ordered(placesOf(codes, pump), placesOf(codes, pouring))).toBe(false);
  });

  it('an accident and a drain cover begin with everybody out, in steps and in cautions', () => {
    for (const { procedure, name } of of(['accident', 'drain-cover'])) {
      expect(procedure.steps[0]?.code, name).toBe('everyone-out');
      expect(['everyone-out', 'drain-holds'], name).toContain(procedure.cautions[0]?.code);
    }
  });

  it('whoever keeps everybody out says a Stop first', () => {
    const out = shown.filter(({ way }) => way.stayOut && way.branch !== 'no-extra-step');
    expect(out.length).toBeGreaterThan(20);
    const late = out.filter(({ procedure }) => procedure.cautions[0]?.severity !== 'stop');
    expect(late.map(({ name }) => name)).toEqual([]);
  });

  it('after a storm: thunder over first, and no switch before the electrician has been', () => {
    for (const { procedure, name } of of(['storm'])) {
      const codes = procedure.steps.map(({ code }) => code);
      expect(codes[0], name).toBe('thunder-over');
      expect(ordered(placesOf(codes, ['electrician']), placesOf(codes, switches)), name).toBe(true);
    }
  });

  it('doses nothing in an open storm, round a drain cover, or against loose stool', () => {
    const held = shown.filter(
      ({ situation, way }) =>
        ['storm', 'drain-cover'].includes(situation.kind) || ['health-department', 'wait-a-day'].includes(way.branch),
    );
    expect(held.length).toBeGreaterThan(10);
    for (const { way, name } of held) expect(way.lead.kind, name).toBe('hold');
  });

  it('treats with a caution against touching products, and lowers water with one that a shell can float', () => {
    for (const { way, name } of shown) {
      if (way.lead.kind === 'treat') expect(way.cautions, name).toContain('never-mix');
      if (way.steps.some(({ code }) => code === 'replace-water'))
        expect(way.cautions, name).toEqual(
          expect.arrayContaining(['shell-can-float', 'pump-before-skimmer', 'outlet']),
        );
    }
  });

  it('opening and closing: what keeps people alive before the pump runs, the breaker last but the cover and the gate', () => {
    for (const { procedure } of of(['opening', 'closing']))
      expect(procedure.steps.slice(0, 2).map(({ code }) => code)).toEqual([
        'drain-cover-looked-at',
        'electrician-tested',
      ]);
    for (const { procedure } of of(['opening'])) {
      const codes = procedure.steps.map(({ code }) => code);
      expect(ordered(placesOf(codes, ['level-up']), placesOf(codes, ['filter-and-pump']))).toBe(true);
      expect(ordered(placesOf(codes, ['ladder', 'gate', 'old-products']), placesOf(codes, ['filter-and-pump']))).toBe(
        true,
      );
    }
    const ticks = (kind: string) => of([kind])[0]!.procedure.steps.filter((step) => step.kind === 'tick').length;
    for (const kind of ['opening', 'closing']) {
      expect(ticks(kind)).toBeGreaterThanOrEqual(12);
      expect(ticks(kind)).toBeLessThanOrEqual(15);
    }
  });
});
