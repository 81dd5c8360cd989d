/** Where a rule stands in the care paper: part 2 the swim verdict, part 3 the ranges, part 4 the doses. */
type Rule = readonly [part: '2' | '3' | '4', says: string];

/**
 * Every bullet and table row of parts 2 and 4 of the care paper, and of part 3 the two sentences that a plan begins with and
 * where tablets end, in short. Each has at least one row in the tests of this folder.
 */
export const rules = {
  // Part 2, the table of states.
  'worst-state-wins': ['2', 'four states, the worst one wins'],
  'at-display': ['2', 'computed at the moment of display'],
  'out-chlorine-low': ['2', 'stay out: free chlorine under the code minimum, 1, stabilized 2'],
  'out-chlorine-high': ['2', 'stay out: free chlorine over 10'],
  'out-pH': ['2', 'stay out: pH under 7.0 or over 8.0'],
  'out-look': ['2', 'stay out: cloudy or green'],
  'out-accident': ['2', 'stay out: an accident is open'],
  'out-drain': ['2', 'stay out: the drain cover is broken'],
  'out-double': ['2', 'stay out: a double dose is suspected'],
  'wait-dose': ['2', 'wait: inside the waiting time of a dose'],
  'wait-middle': ['2', 'wait: the middle over the swim limit or under the lowest level'],
  'wait-pH': ['2', 'wait: pH outside 7.2 to 7.8'],
  'wait-combined': ['2', 'wait: combined chlorine over 0.4'],
  'test-old': ['2', 'test first: chlorine or pH older than 48 h'],
  'test-edges': ['2', 'test first: low edge under the code minimum, high edge over 10'],
  'test-rain': ['2', 'test first: over 10 mm of rain, or a storm'],
  'test-swimmers': ['2', 'test first: more than one swimmer-hour for 4 m3 in a day'],
  'test-failure': ['2', 'test first: the pump or the power failed'],
  'test-due': ['2', 'test first: a dose is due, neither ticked nor skipped'],
  'test-doubt': ['2', 'test first: a tick is in doubt'],
  'test-cover': ['2', 'test first: the cover comes off after a week'],
  fine: ['2', 'fine: none of these'],
  // Part 2, the words.
  'words-of-states': ['2', 'what each state says'],
  'never-safe': ['2', 'never safe, never a bare fine to swim'],
  standing: ['2', 'the standing line under every Fine'],
  'planner-limits': ['2', 'a plan that keeps its three limits keeps the verdict'],
  'parts-of-day': ['2', 'times ahead are parts of the day, from the limit that is met first'],
  'headline-skips-nothing': ['2', 'the headline never says that a dose can be skipped'],
  'after-saving': ['2', 'after saving a test the swim state comes first'],
  'daily-check': ['2', 'from 24 h on a Fine on a swim day advises a check'],
  // Part 2, the two kinds of test.
  'two-tests': ['2', 'a full test makes the plan; a quick check reads chlorine and pH in a minute'],
  'check-before-swim': ['2', 'a quick check is planned before a swim day on which the last reading is too old'],
  'monthly-tests': ['2', 'stabilizer and hardness monthly, by tube or shop slip'],
  'strip-no-tablets': ['2', 'a strip value alone never switches tablets on'],
  // Part 2, the false zero.
  'zero-far-below': ['2', 'asked: a reading under half of the low edge'],
  'zero-after-dose': ['2', 'asked: 0 to 0.5 within 72 h of a dose'],
  'zero-words': ['2', 'none or far too much; half and half, double it; flashed: stay out, add nothing'],
  'zero-holds': ['2', 'until answered no dose, Test first'],
  'bleached-pH': ['2', 'a pH read with free chlorine over 10 is ignored'],
  // Part 3.
  'no-room': ['3', 'lowest level at swim limit - 0.5: no level is both high enough and inside the limit'],
  'open-hours': ['3', 'under 90 % open swim hours: the first sentence says so and offers three ways'],
  'tablets-band': ['3', 'tablets are no candidate above the stabilizer band, and never where water is to be replaced'],
  // Part 4, products.
  'by-ingredient': ['4', 'products by the active ingredient as printed, never by shape'],
  'blends-never': ['4', 'blends and others are stored, never planned'],
  'feeder-match': ['4', 'the feeder’s own ingredient has to match the tablets'],
  'no-skimmer': ['4', 'nothing ever goes into the skimmer'],
  'label-way': ['4', 'dry chlorine: the label’s way is asked, no default; not found: no dose'],
  'liquid-per-cent': ['4', 'liquid: available chlorine or hypochlorite, by weight or by volume'],
  // Part 4, the hour.
  'last-light': ['4', 'after the last swim, in the last hour before sunset'],
  'another-hour': ['4', 'the household may fix another hour'],
  weather: ['4', 'never in thunder, strong wind, heavy rain'],
  'pump-4': ['4', 'the pump runs 4 h after a fast dose, 8 h above +5 mg/L, and that enters the outlook'],
  'pump-until': ['4', 'the step says until when'],
  // Part 4, the order.
  'one-product': ['4', 'one product per visit'],
  'order-of-companions': ['4', 'chlorine to the code minimum, alkalinity, pH, hardness, stabilizer, a re-test between'],
  'low-pH-no-tablets': ['4', 'pH under 7.0 is raised before more tablets'],
  'acid-morning': ['4', 'acid in the morning, chlorine in the evening, own jug, 4 h apart'],
  'calcium-a-day': ['4', 'calcium and bicarbonate or soda a day apart'],
  'first-half': ['4', 'the first dose half in an estimated volume, then a re-test'],
  // Part 4, ticking.
  'three-hours': ['4', 'ticked from 3 h before; earlier the card reads See the steps'],
  'ten-minutes': ['4', 'one tap, ten minutes to undo'],
  'other-amount': ['4', 'another amount: two taps'],
  claim: ['4', '“I am adding it now” shows to all as {name} has it'],
  'two-ticks': ['4', 'two ticks, or a tick and an offline tick: out until a reading'],
  handles: ['4', 'only members who handle chemicals tick; a teenager may test, not dose'],
  'calendar-no-amounts': ['4', 'calendar entries carry no amounts'],
  'made-and-until': ['4', 'print and offline views say when they were made and until when they hold'],
  probe: ['4', 'a probe’s reading is never the only ground of a dose'],
  'no-pump-drive': ['4', 'no interface drives a pump'],
  'learnt-volume': ['4', 'a learnt volume: chlorine only, within 15 %, beyond: measure again'],
  'stop-by-name': ['4', 'a Stop is confirmed by name, once per product, again after 90 days or a change'],
  // Part 4, caps per evening.
  'cap-lower-of': ['4', 'the lower of the cap, the label and the projected edges'],
  'cap-calcium-hypochlorite': ['4', 'calcium hypochlorite: +4, 6.2 g, next morning, 4 h and under the limit'],
  'cap-treatment': ['4', 'granules and liquid on a treatment evening: to 10 in total'],
  'cap-sodium-hypochlorite': ['4', 'sodium hypochlorite: +4, 32 mL, next morning, 4 h and under the limit'],
  'cap-dichlor': ['4', 'dichlor: +2, 3.6 g, not weekly, stabilizer under 50'],
  'cap-trichlor': ['4', 'tablets: one for 18 to 25 m3 a week, stabilizer +6, weekly re-test, 15 minutes'],
  'cap-hydrochloric-acid': ['4', 'acid: pH 0.4 at most, low edge not under 7.2, 16 mL, first half, next day, 4 h'],
  'cap-sodium-bisulfate': ['4', 'dry acid: the same, 20 g'],
  'cap-sodium-bicarbonate': ['4', 'bicarbonate: +20, 34 g, 24 h, 2 h'],
  'cap-sodium-carbonate': ['4', 'soda: +9, none over pH 7.5 or hardness 300, 10 g, 24 h, 4 h and clear'],
  'cap-calcium-chloride': ['4', 'calcium chloride: +30, 1 kg per 15 L, 43 g, 24 h, 4 h and clear'],
  'cap-cyanuric-acid': ['4', 'cyanuric acid: +20, mesh bag before a return, 20 g, 7 days, 4 h'],
  'cap-sodium-thiosulfate': ['4', 'thiosulfate: half of the excess, only above 10, 2 h'],
  'cap-water': ['4', 'water exchange: 15 cm of level a day, next day'],
  'until-the-morning': ['4', 'one sentence covers most evenings: nobody in until the morning'],
} as const satisfies Record<string, Rule>;

export type RuleId = keyof typeof rules;

/** Rules that are about what stands on the screen: tested where pages are drawn. */
export const rulesOnScreen = [
  'standing',
  'after-saving',
  'daily-check',
  'three-hours',
  'other-amount',
  'claim',
  'handles',
  'stop-by-name',
] as const satisfies readonly RuleId[];
