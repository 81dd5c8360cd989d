import { describe, expect, it } from 'vitest';
import { type Forbidden, found, notAllowed } from './forbidden';
import { everySentence, said, written } from './words';

/** Where a number is explained: the field's own terms may stand there beside the plain ones. */
const help = ['how', 'how-constants', 'how-examples'] as const;

/** Care paper, part 11: words of the field that do not stand on a screen, each with where it is something else. */
const notOnScreen: readonly Forbidden[] = [
  {
    what: 'floor, for the lowest level',
    pattern: /\bfloors?\b/i,
    allowed: [
      // The ground of a pool or a shed.
      'What lies on the floor is brushed at once.',
      'Original containers, labels readable, off the floor, out of sun and heat.',
      'Dry hands, dry floor.',
      'The floor',
      'rectangle, sloping floor',
      'oval, sloping floor',
      'kidney, sloping floor',
      'mean depth by floor.',
      'Exact for straight walls and a plain floor.',
      'Ozone moves ultraviolet light by about a sixth from day to day, and the strength of the sun over one pool is uncertain by about a quarter: trees, walls, the colour of the floor.',
    ],
    planted: 'Free chlorine is at its floor.',
  },
  { what: 'ceiling, for the swim limit', pattern: /\bceilings?\b/i, allowed: [], planted: 'It is over the ceiling.' },
  {
    what: 'drift, for what is left behind',
    pattern: /\bdrift(s|ed|ing)?\b/i,
    allowed: [],
    planted: 'Drift of stabilizer.',
  },
  { what: 'swing, for ups and downs', pattern: /\bswings?\b/i, allowed: [], planted: 'The swing of a week.' },
  {
    what: 'shock, for a treatment evening',
    pattern: /\bshock\w*/i,
    allowed: [],
    planted: 'Shock the pool tonight.',
  },
  {
    what: 'breakpoint, outside help',
    pattern: /breakpoint/i,
    except: help,
    allowed: [],
    planted: 'Raise it to breakpoint.',
  },
  {
    what: 'combined chlorine without used-up',
    pattern: /^(?!.*used-up).*\bcombined\b/i,
    allowed: [
      // Said right after the heading: used-up chlorine.
      'kits call it combined;',
    ],
    planted: 'Combined chlorine is high.',
  },
  {
    what: 'short names of the trade',
    // Not the keys of an argument: a country is one of two letters too.
    pattern: /\b(CYA|FC|CC|TC|TA|CH|LSI|ORP|cal-?hypo|bleach)\b(?! \{)/,
    allowed: [],
    planted: 'CYA is high.',
  },
  {
    what: 'a maker or a brand',
    pattern: /®|™|\bbrand\w*|\bmade by\b|\bproduct line\b/i,
    allowed: [],
    planted: 'Take tablets of this brand.',
  },
  {
    what: 'a promise',
    pattern: /\b(guarantee\w*|harmless|no risk|without risk|nothing can happen|always fine)\b/i,
    allowed: [],
    planted: 'The water is harmless.',
  },
];

describe.each(notOnScreen)('not on a screen: $what', (forbidden) => {
  it('stands nowhere', () => {
    expect(notAllowed(forbidden)).toEqual([]);
  });

  it('would be seen in a new sentence', () => {
    const planted = { at: 'week: planted', text: `Test first. <b>${forbidden.planted}</b>` };
    expect(notAllowed(forbidden, [planted])).toEqual([forbidden.planted]);
  });

  it('allows no sentence that nobody says any more', () => {
    const said = found(forbidden);
    expect(forbidden.allowed.filter((sentence) => !said.includes(sentence))).toEqual([]);
  });
});

describe('the plain words of the care paper, part 11', () => {
  it.each<[word: string, at: string]>([
    ['lowest level', 'week: chart.lowest'],
    ['swim limit', 'week: chart.limit'],
    ['good range', 'week: chart.goodRange'],
    ['likely range', 'week: water.likely'],
    ['granules', 'doses: product.calcium-hypochlorite'],
    ['slow tablets', 'doses: product.trichlor'],
    ['stabilizer', 'week: lane.stabilizer'],
    ['stabilizer left behind', 'week: four.stabilizer'],
    ['calcium left behind', 'week: four.hardness'],
    ['ups and downs', 'week: four.swing'],
    ['used-up chlorine', 'verdict: reason.combined-chlorine-high'],
    ['scale-or-etch balance', 'week: why.caution.hardness-outside-surface-range'],
    ['treatment evening', 'doses: reason.treatment-evening'],
    ['shop slip', 'week: method.slip'],
    ['replace some water', 'week: why.reason.replace-water-first'],
    ['try it', 'how-examples: title'],
  ])('%s', (word, at) => {
    expect(written(at).toLowerCase()).toContain(word);
  });

  it.each<[word: string, explained: RegExp, at: string]>([
    ['chlorine granules', /chlorine granules \(calcium hypochlorite\)/i, 'house: shop.product.calcium-hypochlorite'],
    ['slow tablets', /slow tablets \(trichlor\)/i, 'house: shop.product.trichlor'],
    ['used-up chlorine', /used-up chlorine \(combined\)/i, 'situations: kind.combined-chlorine.name'],
    ['alkalinity', /what keeps pH steady/i, 'how: page.alkalinity.note'],
  ])('%s is explained once by the field’s own word', (_word, explained, at) => {
    expect(written(at)).toMatch(explained);
  });

  it('no shop slip means nothing to buy is said as such', () => {
    expect(said('house: shop.buyNothing')).toMatch(/buy nothing/);
  });

  it('reads the words of every page', () => {
    const namespaces = new Set(everySentence.map(({ at }) => at.split(':')[0]));
    for (const each of ['verdict', 'doses', 'situations', 'events', 'week', 'help', 'house', 'readings', 'rounds'])
      expect(namespaces).toContain(each);
  });
});
