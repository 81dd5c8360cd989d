import { expect } from 'vitest';
import { liquidStrengthBases } from '@/lib/storage/label-strength';
import { labelWays, substances } from '@/lib/schemas/shelf-product';
import { swimStates } from '@/lib/verdict/codes';
import { falseZeroQuestion } from '@/lib/verdict/false-zero';
import { HOUR, takenAt } from '@/tests/verdict/inputs';
import type { Row } from '../row';
import { everySentence, said, written } from '../words';

const under = (start: string) => everySentence.filter(({ at }) => at.startsWith(start));
const asked = (value: number, lowEdge: number | undefined, hoursAfterDose: number | undefined) =>
  falseZeroQuestion(
    { value, takenAt },
    lowEdge,
    hoursAfterDose === undefined ? undefined : takenAt - hoursAfterDose * HOUR,
  ) !== undefined;
/** The cards of doses that are poured, dissolved or scattered. */
const cards = ['granules-dissolve', 'granules-broadcast', 'liquid', 'acid', 'dry-acid', 'companion-dissolve'] as const;
const cardOf = (card: string) =>
  ['1', '2', '3', '4', '5', '6']
    .map((step) => said(`doses: steps.${card}.${step}`, { hours: 4, litres: '15 L', after: '', heats: 'no' }))
    .join(' ');

/** What parts 2, 3 and 4 want said, held against what is written. */
export const sentenceRows: readonly Row[] = [
  [
    'words-of-states',
    'each state has its words, and its headline those of the paper',
    () => {
      expect(swimStates.map((state) => written(`verdict: state.${state}`))).toEqual([
        'Stay out',
        'Wait',
        'Test first',
        'Fine',
      ]);
      expect(said('verdict: headline.stay-out', { reason: 'the water is green' })).toBe(
        'Stay out: the water is green.',
      );
      expect(said('verdict: headline.wait', { part: 'this evening' })).toBe('Wait until this evening.');
      expect(written('verdict: headline.test-first')).toBe('Test before anyone swims.');
      expect(said('verdict: headline.fine', { part: 'Tuesday evening' })).toBe(
        'The water is fine for swimming until Tuesday evening.',
      );
    },
  ],
  [
    'never-safe',
    'no sentence of the verdict says safe, or fine to swim',
    () => {
      for (const { text } of [...under('verdict: '), ...under('situations: headline')])
        expect(text).not.toMatch(/\bsafe|fine to swim\b/i);
    },
  ],
  [
    'standing',
    'the standing line is that of the paper, word by word',
    () =>
      expect(said('verdict: standing')).toBe(
        'Before anyone goes in: you can see the bottom drain and its cover is whole, an adult is watching and doing nothing else, no thunder in the last 30 minutes.',
      ),
  ],
  [
    'daily-check',
    'the advice of the authorities is that of the paper, word by word',
    () =>
      expect(written('verdict: dailyCheck')).toBe(
        'Health authorities advise a check on every day of swimming: one minute.',
      ),
  ],
  [
    'parts-of-day',
    'a headline names a part of a day: no figure, no hour, no minute',
    () => {
      for (const { text } of under('verdict: headline')) expect(text).not.toMatch(/\d|\{(?!part|reason)|minute|hour/);
      const parts = [...under('week: part'), ...under('week: today'), ...under('week: dayPart')];
      for (const { text } of parts) expect(text).not.toMatch(/\d|minute|hour/);
    },
  ],
  [
    'headline-skips-nothing',
    'no headline speaks of leaving out a dose',
    () => {
      for (const { text } of under('verdict: '))
        expect(text).not.toMatch(/can (be )?skip|no need|not needed|leave .*out/i);
      for (const { text } of under('verdict: headline')) expect(text).not.toMatch(/dose|skip/i);
    },
  ],
  [
    'two-tests',
    'the quick check: chlorine and pH, one minute, three taps; the full test makes the plan',
    () =>
      expect(written('readings: quickNote')).toMatch(
        /Chlorine and pH, one minute, three taps.*full test makes the plan/,
      ),
  ],
  [
    'monthly-tests',
    'stabilizer is asked for by tube or shop slip; a strip does not decide it',
    () => {
      expect(written('week: state.stabilizerNever')).toMatch(/tube or a shop slip/);
      expect(written('readings: strip.tubeDecides')).toBe('tube or shop slip decides');
      expect(written('situations: step.test-stabilizer.note')).toMatch(/tube or shop slip; a strip alone does not do/);
    },
  ],
  [
    'zero-far-below',
    'a reading under half of the low edge is asked about, one at half is not',
    () => {
      expect(asked(1.24, 2.5, undefined)).toBe(true);
      expect(asked(1.25, 2.5, undefined)).toBe(false);
    },
  ],
  [
    'zero-after-dose',
    'a reading of 0 to 0.5 within 72 h of a dose is asked about',
    () => {
      expect([0, 0.5].map((value) => asked(value, 0.6, 72))).toEqual([true, true]);
      expect([asked(0.51, 0.6, 72), asked(0.5, 0.6, 72.01), asked(0.5, 0.6, undefined)]).toEqual([false, false, false]);
    },
  ],
  [
    'zero-words',
    'none, or far too much; half pool, half tap water that stood in the sun; double; flash: stay out, add nothing',
    () => {
      const zero = (place: string) => written(`readings: zero.${place}`);
      expect(zero('title')).toBe('Zero can mean none, or far too much.');
      expect(zero('bleaches')).toMatch(/[Ss]trong chlorine bleaches the colour/);
      expect(zero('mix')).toBe('Mix half pool water, half tap water that stood in the sun.');
      expect(zero('double')).toBe('Test the mix, then double the result.');
      expect(zero('ask')).toBe('Did the colour flash and vanish?');
      const flashed = ['word', 'headline', 'note'].map((part) => zero(`state.flashed.${part}`)).join(' ');
      expect(flashed).toBe('Then it is too much Stay out, add nothing. Test tomorrow.');
      for (const state of ['open', 'later']) {
        expect(zero(`state.${state}.headline`)).toBe('Test before anyone swims.');
        expect(zero(`state.${state}.note`)).toMatch(/no dose/i);
      }
    },
  ],
  [
    'no-room',
    'the sentence: no level both high enough and inside the limit, replace some water first',
    () =>
      expect(written('week: why.reason.replace-water-first')).toMatch(
        /chlorine level is both high enough and inside your label’s swim limit.*Replace some water first/,
      ),
  ],
  [
    'open-hours',
    'the sentence offers more evenings, less stabilizer, or quick checks',
    () =>
      expect(written('week: why.reason.few-open-hours')).toMatch(
        /of 100 swim hours.*More evenings, less stabilizer, or quick checks/,
      ),
  ],
  [
    'by-ingredient',
    'the shelf asks for the ingredient as printed, and says that the shape does not tell',
    () => {
      expect(written('pool: product.ingredient')).toBe('Active ingredient, as printed');
      expect(written('pool: shelf.lead')).toMatch(/shape of a product does not tell/);
      const names = substances.map((substance) => written(`pool: ingredient.${substance}.name`));
      expect(names).toEqual(
        expect.arrayContaining([
          'Trichloro-s-triazinetrione',
          'Sodium dichloro-s-triazinetrione',
          'Calcium hypochlorite',
          'Sodium hypochlorite',
          'Hydrochloric acid',
        ]),
      );
    },
  ],
  [
    'blends-never',
    'a blend is said to be kept and never planned',
    () => expect(written('pool: ingredient.other.plain')).toMatch(/kept on the shelf and never planned/),
  ],
  [
    'feeder-match',
    'the feeder’s own label is asked for, and why',
    () => {
      expect(written('pool: water.feeder.ingredient')).toMatch(/Active ingredient on the feeder’s own label/);
      expect(written('pool: water.feeder.ingredientNote')).toMatch(/Only tablets of this very ingredient/);
    },
  ],
  [
    'no-skimmer',
    'said before any dose: on the safety card, where tablets are set up, and on the house sheet',
    () => {
      expect(written('help: safety.during.three')).toBe('Nothing goes into the skimmer.');
      expect(written('pool: water.feeder.note')).toBe('Never in the skimmer.');
      expect(said('house: sheet.doses.measure')).toMatch(/Nothing goes into the skimmer/);
      expect(written('situations: step.dose.note')).toMatch(/Nothing into the skimmer/);
    },
  ],
  [
    'label-way',
    'four answers, no usual way, and not found means no dose',
    () => {
      expect(labelWays).toEqual(['dissolve', 'broadcast', 'feeder-only', 'unknown']);
      expect(written('pool: product.missing.labelWay')).toMatch(/There is no usual way/);
      expect(written('pool: product.way.unknown.label')).toBe('I cannot find it');
      expect(written('pool: product.way.unknown.detail')).toMatch(/no dose of it is planned/);
    },
  ],
  [
    'liquid-per-cent',
    'available chlorine or sodium hypochlorite, by weight or by volume: four answers, each with its words',
    () => {
      expect(liquidStrengthBases).toHaveLength(4);
      const words = liquidStrengthBases.map((basis) => written(`pool: product.strength.basis.${basis}`));
      expect(words.filter((text) => text.startsWith('sodium hypochlorite'))).toHaveLength(2);
      expect(words.filter((text) => text.startsWith('available chlorine'))).toHaveLength(2);
      expect(words.filter((text) => text.includes('by weight'))).toHaveLength(2);
    },
  ],
  [
    'weather',
    'never in thunder, strong wind, heavy rain: on the safety card and on the house sheet; no dosing in a storm',
    () => {
      expect(said('help: safety.before.three')).toMatch(/never in thunder, strong wind or heavy rain/);
      expect(said('house: sheet.doses.weather')).toMatch(/Thunder, strong wind, heavy rain.*add nothing/);
      expect(written('situations: caution.thunder.text')).toMatch(/^No dosing either/);
      expect(written('events: dosing.storm')).toMatch(/^Nothing goes in before the test after the storm/);
    },
  ],
  [
    'pump-until',
    'every card that pours says for how long the pump stays on, and the dose until when',
    () => {
      for (const card of cards) expect(cardOf(card)).toMatch(/Pump on now; leave it on 4 hours/);
      expect(said('doses: pump', { time: '23:40' })).toBe('Pump on until 23:40.');
      expect(written('doses: when.aboutPump')).toMatch(/pump on until \{until\}/);
    },
  ],
  [
    'one-product',
    'said on the safety card, and never two products together',
    () => {
      expect(written('help: safety.during.one')).toMatch(/^One product a visit/);
      expect(written('common: neverMix')).toBe(
        'Never let two different pool products touch: not dry, not wet, not in a feeder, bucket, scoop or bin. Two chlorines can explode too.',
      );
    },
  ],
  [
    'acid-morning',
    'the acid cards say never the same visit; liquid acid has its own marked jug',
    () => {
      for (const card of ['acid', 'dry-acid']) expect(cardOf(card)).toMatch(/^Never the same visit as chlorine/);
      expect(cardOf('acid')).toMatch(/marked jug kept for acid/);
      expect(written('help: safety.during.one')).toMatch(
        /Acid in the morning, chlorine in the evening, each with its own jug/,
      );
      expect(written('situations: caution.acid-alone.text')).toMatch(/morning.*evening, at least 4 hours apart/);
    },
  ],
  [
    'first-half',
    'the dose says why it is half, and that a test comes after it',
    () => expect(written('doses: reason.first-dose-halved')).toMatch(/^Half, because.*estimated; test again/),
  ],
  [
    'learnt-volume',
    'beyond 15 per cent: measure the pool again; else chlorine by the one, everything else by the other',
    () => {
      expect(written('learnt: measureAgain.heading')).toBe('Measure the pool again.');
      expect(written('learnt: measureAgain.words')).toMatch(/further than 15 per cent/);
      expect(written('learnt: words.volumeDiffers')).toMatch(
        /^Chlorine is worked out for \{learnt\}, everything else for/,
      );
    },
  ],
];
