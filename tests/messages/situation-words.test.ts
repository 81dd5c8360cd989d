import { describe, expect, it } from 'vitest';
import words from '@/lib/messages/en/situations.json';
import { situationEndings, situationKinds } from '@/lib/schemas/situation';
import { branches, calls, cautions, endings, headlines, reasons, steps } from '@/lib/situations/codes';

const sorted = (codes: Iterable<string>) => [...new Set(codes)].toSorted();

describe('the words of situations', () => {
  it.each([
    ['kinds', situationKinds, words.kind],
    ['what kinds are for', situationKinds, words.about],
    ['branches', Object.values(branches).flat(), words.branch],
    ['headlines', headlines, words.headline],
    ['sentences under headlines', headlines, words.headlineLead],
    ['cautions', cautions, words.caution],
    ['steps', steps, words.step],
    ['reasons', reasons, words.reason],
    ['endings', endings, words.done],
    ['calls', calls, words.call],
    ['how one ended', situationEndings, words.past.ending],
  ])('%s: every code has words, and no words lack a code', (_, codes, said) => {
    expect(sorted(Object.keys(said))).toEqual(sorted(codes));
  });

  const all = JSON.stringify(words);

  it('promise no safety, measure with nothing from the kitchen and plan nothing that is not planned here', () => {
    expect(all).not.toMatch(/\bsafe(ly|ty)?\b/i);
    expect(all).not.toMatch(/\b(cup|mug|spoon|handful|splash)s?\b/i);
    expect(all.match(/copper|clearing agent|acid wash/gi)).toHaveLength(6);
    expect(all).not.toMatch(/\b(ten|10)[ -]times\b|\bbreakpoint\b|\bshock\b(?!":)/i);
  });

  it('say out of the water before anything else of an accident, and name no time for loose stool', () => {
    expect(words.caution['everyone-out'].title).toMatch(/^Everyone out/);
    const loose = [words.caution['no-time-for-loose-stool'], words.branch['health-department']].map((each) =>
      JSON.stringify(each),
    );
    for (const said of loose) {
      expect(said).toMatch(/call the health department/i);
      expect(said).not.toMatch(/\d|minutes|hours|until|mg\/L|ppm/);
    }
  });

  it('a tingle: away and out, power off before help, then the number, a pole and an electrician', () => {
    const { title, text } = words.caution.shock;
    const said = `${title} ${text}`;
    const order = [
      'away from the spot',
      'out',
      'metal ladder',
      'power off',
      'emergency number',
      'pole',
      'electrician',
      'nobody back',
    ];
    const places = order.map((part) => said.indexOf(part));
    expect(Math.min(...places)).toBeGreaterThanOrEqual(0);
    expect(places).toEqual(places.toSorted((a, b) => a - b));
  });

  it('somebody held by a drain: pump off first; everybody else out, then the pump', () => {
    for (const said of [words.caution['drain-holds'].text, words.headlineLead['out-drain-cover']])
      expect(said).toMatch(/held: pump off first.*emergency number.*everyone out, then pump off.*Nobody in until/i);
  });

  it('protect before the pump, and the pump before anything is poured', () => {
    for (const code of ['liquid-low', 'granules-into-water', 'acid-alone'] as const)
      expect(words.caution[code].text).toMatch(/Nobody in the water.*[Gg]oggles.*Pump on/);
    expect(words.step.dose.note).toMatch(/Nobody in.*goggles and gloves.*pump on.*pour.*Nothing into the skimmer/);
  });
});
