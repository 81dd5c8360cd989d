import { describe, expect, it } from 'vitest';
import { type Forbidden, found, notAllowed } from './forbidden';
import { everySentence, type Sentence } from './words';

/** What the care paper never advises, wherever it might be written; what may be said beside it stands here in full. */
const neverAdvised: readonly Forbidden[] = [
  {
    what: 'water onto product, or into acid',
    pattern: /\bonto\b|\bwater (to|into|over|on) (the |it\b|acid|granules|product|powder|tablets)/i,
    allowed: [
      'Never water onto granules.',
      'Never water onto granules, nothing into the skimmer.',
      'Pour low and slowly into the deep end by a return, or first into a bucket of pool water if the label says dilute: acid into water, never water into acid.',
      'Never water onto it.',
      'stir with plastic until it is gone.}} Never water onto the product.',
      'Product into water, never water onto product.',
      'Nothing goes into the skimmer, no water onto product, one product a visit.',
      'Granules into water, never water onto granules.',
      'Not into the bin, and never one onto another.',
    ],
    planted: 'Pour a little water onto the granules.',
  },
  {
    what: 'anything into a skimmer',
    pattern: /skimmer/i,
    allowed: [
      'Never water onto granules, nothing into the skimmer.',
      'Never into the skimmer.',
      'Never in the skimmer.',
      'Nothing goes into the skimmer.',
      'Nothing ever goes into the skimmer.',
      'Nothing into the skimmer.',
      'Nothing goes into the skimmer, no water onto product, one product a visit.',
      'Nothing goes into the skimmer, never two products together.',
      // The level of the water, and what is emptied.
      'Water halfway up the skimmer.',
      'halfway up the skimmer',
      'Too low: top up to halfway up the skimmer.',
      'Skimmer and pump baskets',
      'Pump, heater and feeder off before the level reaches the skimmer.',
      'Pump, heater, feeder off before the level reaches the skimmer.',
      'They stay off until the water is back at mid-skimmer.',
      'Level at mid-skimmer',
      'Water at mid-skimmer.',
      'Fill to mid-skimmer',
    ],
    planted: 'Put two tablets into the skimmer basket.',
  },
  {
    what: 'kitchen measures',
    pattern: /\b(cup|mug|spoon|teaspoon|tablespoon|handful|capful|pinch|dash|glass|splash|jar|kitchen)(s|ful|fuls)?\b/i,
    allowed: [
      'Use the marked measure kept for this product, nothing from the kitchen.',
      'Kept for this product alone, nothing from the kitchen.',
      'Keep a marked measure for each product, nothing from the kitchen.',
      // No measures.
      'Every figure on the week sheet follows from a handful of equations.',
      'Splash-out',
    ],
    planted: 'Two cups of granules.',
  },
  {
    what: 'safe as a verdict',
    pattern: /\b(un)?safe\w*/i,
    allowed: [
      // The card, and what it is about.
      'Only those who handle chemicals tick a dose: an adult who has read the safety card.',
      'Only a member who handles chemicals, and has read the safety card this season, can be named.',
      'I do: I am an adult and have read the safety card',
      'Read the safety card: one minute',
      'I am an adult and have read the safety card',
      'only adults who have read the safety card, again each season, tick doses.',
      'May handle chemicals once they have read the safety card of this season',
      'Handles chemicals: adult, safety card read {when}',
      'May handle chemicals in these days once the safety card of this season is read.',
      'May handle chemicals in these days: adult, safety card read this season.',
      'Only once they have read the safety card of this season.',
      'read the safety card',
      'Keeping safe',
      'keeping safe, is it for your pool',
      'What to do when something is wrong, how to stay safe beside the chemicals, and what Wadewell cannot know.',
      // Of a switch that somebody is to reach, and of a plan that was refused.
      'Pump and feeder off, if that is safe.',
      'The plan did not pass its safety check, so it is not shown.',
    ],
    planted: 'The water is safe until tomorrow.',
  },
  {
    what: 'copper, clearing agents, acid wash',
    pattern: /copper|clearing agent|acid wash|alga?ecide|algicide|floccul|clarif/i,
    allowed: [
      'No copper products, no clearing agents, no acid wash.',
      'No copper products, clearing agents or acid wash are planned here.',
      'Blends, clearing agents, copper and salt systems.',
      // What a shop said to buy, answered with: keep away.
      'A copper product against algae',
      'A clearing agent',
      'Copper stains, and no dose of it is worked out here.',
      // What keeps a pool clean, and what a heater is made of.
      'Copper or silver',
      'Bromine, biguanide, copper or silver',
      'A heater with copper inside',
    ],
    planted: 'Add a clearing agent in the evening.',
  },
  {
    what: 'breaking tablets',
    pattern: /\b(break|broke|broken|crush|grind|halve|halves|split|crumble|saw)(s|ing|ed)?\b/i,
    allowed: [
      'Never break or crush one.',
      'By eye: two halves count as one, a lone half as none.',
      // Drain covers, and what the sun does.
      'A drain cover is loose, broken or missing',
      'Drain cover loose, broken or missing',
      'Loose, broken or missing: pump off, nobody in until it is replaced.',
      'Drain cover loose, broken, missing: somebody held: pump off first, then call emergency.',
      'A loose, broken or missing drain cover is different: pump off, nobody in until it is replaced.',
      'How fast the sun breaks down chlorine that stabilizer holds: no good published figure.',
      'The largest doubt is the sun: no good published figure says how fast it breaks down chlorine that stabilizer holds.',
      'Hypochlorite is its slow sister, favoured when pH is high, and the sun breaks it down fastest.',
      'Sunlight breaks chlorine down by its ultraviolet part.',
      'Rate at which hypochlorite breaks down',
    ],
    planted: 'Break the last one in two.',
  },
  {
    what: 'mixing products',
    pattern: /\b(mix|mixes|mixed|mixing|mixture|together|combine|combines|blend|blends)\b/i,
    allowed: [
      'Mixing systems can be dangerous.',
      'Until you know, add nothing: mixing systems can be dangerous.',
      'Dirty, wet or mixed',
      'Never two products together: not dry, not wet, not in a feeder, bucket, scoop or bin.',
      'Nothing goes into the skimmer, never two products together.',
      'Does something leak: add no water, sweep nothing together.',
      'A blend, or anything else',
      'Another active ingredient, or a blend',
      'A blend is kept on the shelf and never planned: nobody can tell what each part of it does.',
      'Blends, clearing agents, copper and salt systems.',
      'blend',
      // Water with water, for the test of a zero.
      'Mix half pool water, half tap water that stood in the sun.',
      'Test the mix, then double the result.',
      // The forms of chlorine that take turns in a week, and other things that are told together.
      'Why a mix of three',
      'Why this mix',
      'this mix',
      'This week’s mix and each form alone, compared on what they cost you or the water.',
      '{evenings, plural, =1 {One evening dose} =2 {Two evening doses} =3 {Three evening doses} =4 {Four evening doses} =5 {Five evening doses} =6 {Six evening doses} =7 {Seven evening doses} other {# evening doses}} of {form} {closes, select, no {{evenings, plural, one {narrows} other {narrow}}} other {{evenings, plural, one {closes} other {close}}}} the gap, {lastLight, select, no {when everyone is out} other {at last light when everyone is out}}, together +{rise} of free chlorine.',
      'Where the water is not mixed.',
      'It is not a promise for all hours together.',
      'It cannot tell apart what always comes together: strong sun and a wrong volume can look alike until a dose and a cloudy week part them.',
      'Haze, shade and depth together.',
      'This place and the time zone {timeZone} do not go together: the sun would stand highest at the wrong hour.',
      'This e-mail address and this password do not go together.',
    ],
    planted: 'Mix the two in one bucket.',
  },
  {
    what: 'using a spill again',
    pattern:
      /\b(spill|spills|spilt|spilled|sweep|swept|re-?use|used again)\b|\bback (in|into|to) (the|its) (tub|can|bucket|container)|put (it|them|what) back|goes back/i,
    allowed: [
      'Sweep it up with a clean dry plastic pan.',
      'Do not put it back, do not bin it: ask the waste site.',
      'Does something leak: add no water, sweep nothing together.',
      'What is left goes back into nothing: ask the waste site.',
      // Names of what happened, and other things than products.
      'breathed it, eyes, skin, swallowed, smoke, spills',
      'A spill',
      'It was spilt, drunk from or stood in the sun, or water ran into the pool.',
      'Nobody goes back in until this page says that it is done.',
    ],
    planted: 'Sweep it up and put it back into the tub.',
  },
  {
    what: 'the vacuum for an accident',
    pattern: /vacuum/i,
    allowed: ['lift it out with a net, never the vacuum.', 'Never the vacuum.'],
    planted: 'Vacuum it up.',
  },
  {
    what: 'emptying a pool',
    pattern: /\b(empty|drain) (it|the pool|the water|all)\b|\bempty after\b|\bemptied\b/i,
    allowed: [
      'Never empty it: a shell can float.',
      // Under 2 m3.
      'A pool this small is emptied, not dosed.',
      'Under 2 m³ (530 US gallons): empty it after every day of use.',
      'Empty after every day of use.',
      // Of baskets, and of somebody held at the drain.
      'emptied, lids back on',
      'When somebody is held at the drain it has to be found at once.',
    ],
    planted: 'Drain the pool and start anew.',
  },
  {
    what: 'a ten-times rule outside the help pages',
    pattern: /\b(ten|10)[ -]?times|super-?chlorin/i,
    except: ['how', 'how-examples', 'how-constants'],
    allowed: [],
    planted: 'Raise it to ten times the used-up chlorine.',
  },
];

describe.each(neverAdvised)('never advised: $what', (forbidden) => {
  it('is said nowhere but where it is forbidden, or where it is something else', () => {
    expect(notAllowed(forbidden)).toEqual([]);
  });

  it('would be seen in a new sentence', () => {
    expect(
      notAllowed(forbidden, [{ at: 'doses: planted', text: `Goggles on. <b>${forbidden.planted}</b> Tick.` }]),
    ).toEqual([forbidden.planted]);
  });

  it('allows no sentence that nobody says any more', () => {
    const said = found(forbidden);
    expect(forbidden.allowed.filter((sentence) => !said.includes(sentence))).toEqual([]);
  });
});

describe('loose stool', () => {
  const loose = /loose.stool|diarrh|health.department/i;
  const aboutTime = /\d|\b(minute|hour|day|week|month|morning|evening|mg\/L|until)s?\b/i;
  /** Whole messages, by their words or by their place: a waiting time in the next sentence would be one all the same. */
  const toldOf = (among: readonly Sentence[]) => {
    const about = among.filter(({ at, text }) => loose.test(text) || loose.test(at));
    return [...new Set(about.flatMap(({ text }) => text.split(/(?<=[.!?;])\s+/)))].filter((each) =>
      aboutTime.test(each),
    );
  };
  const allowed = [
    'Nobody swims with diarrhoea or within two weeks of it.',
    'Nobody swims with diarrhoea, or within two weeks of it.',
    'The half hour after thunder and the two weeks after diarrhoea are published advice.',
    // Stands beside it, of other things.
    'One product a visit, acid apart from chlorine, and nobody in until the morning are common practice, stricter than the waits that authorities print.',
  ];

  it('has no waiting time, no level and no day anywhere', () => {
    expect(toldOf(everySentence).toSorted()).toEqual(allowed.toSorted());
  });

  it('would be seen with one', () => {
    const text = 'Loose stool: stay out. Raise chlorine, and back in after 28 hours.';
    expect(toldOf([{ at: 'situations: planted', text }])).toEqual(['Raise chlorine, and back in after 28 hours.']);
  });
});
