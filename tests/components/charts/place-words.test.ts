import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Box, boxOf, type Place, placeWords, type Words } from '@/components/charts/place-words';

const bounds: Box = { x: 0, y: 0, width: 400, height: 200 };
const line = (text: string) => [[{ text, size: 12, weight: 'plain' as const }]];
const overlap = (a: Box, b: Box) =>
  a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;

describe('placeWords', () => {
  it('takes the first place that is free', () => {
    const words: Words = {
      id: 'limit',
      lines: line('Swim limit 4'),
      places: [
        { x: 10, y: 10, anchor: 'start' },
        { x: 10, y: 100, anchor: 'start' },
      ],
    };
    expect(placeWords([words], [], bounds)[0]).toMatchObject({ y: 10 });
    expect(placeWords([words], [{ x: 0, y: 0, width: 50, height: 20 }], bounds)[0]).toMatchObject({ y: 100 });
  });

  it('leaves out what may be left out, and never what says a limit', () => {
    const everywhere = [{ x: 0, y: 0, width: 400, height: 200 }];
    const words: Words = { id: 'a', lines: line('words'), places: [{ x: 10, y: 10, anchor: 'start' }] };
    expect(placeWords([words], everywhere, bounds)).toHaveLength(1);
    expect(placeWords([{ ...words, mayBeLeftOut: true }], everywhere, bounds)).toEqual([]);
  });

  it('puts indispensable words without a free place where they hide least, words before all, and inside the chart', () => {
    const first: Words = { id: 'a', lines: line('first'), places: [{ x: 10, y: 10, anchor: 'start' }] };
    const second: Words = {
      id: 'b',
      lines: line('second'),
      places: [
        { x: 10, y: 10, anchor: 'start' },
        { x: 390, y: 100, anchor: 'start' },
      ],
    };
    const curve = { x: 0, y: 90, width: 400, height: 40 };
    const [, placed] = placeWords([first, second], [curve], bounds);
    expect(placed).toMatchObject({ y: 100 });
    const box = boxOf(second.lines, placed!);
    expect(box.x + box.width).toBeLessThanOrEqual(400);
  });

  it('says in less room what has no place in full', () => {
    const shelf = { x: 60, y: 0, width: 340, height: 200 };
    const words: Words = {
      id: 'a',
      lines: line('Swim limit 4, from the label'),
      shorter: [line('Swim limit 4'), line('4')],
      places: [
        { x: 0, y: 10, anchor: 'start' },
        { x: 0, y: 30, anchor: 'start' },
      ],
    };
    expect(placeWords([words], [shelf], bounds)[0]?.lines).toEqual(line('4'));
    expect(placeWords([words], [], bounds)[0]?.lines).toEqual(words.lines);
  });

  it('keeps air between words', () => {
    const words = (id: string, y: number): Words => ({
      id,
      lines: line('words'),
      places: [{ x: 10, y, anchor: 'start' }],
    });
    const under = { ...words('b', 23), mayBeLeftOut: true as const };
    expect(placeWords([words('a', 10), under], [], bounds)).toHaveLength(1);
    expect(
      placeWords([words('a', 10), { ...under, places: [{ x: 10, y: 24.5, anchor: 'start' }] }], [], bounds),
    ).toHaveLength(2);
  });

  it('stays inside the chart at both ends', () => {
    const ends: Place[] = [
      { x: 395, y: 10, anchor: 'start' },
      { x: 395, y: 10, anchor: 'end' },
    ];
    const [placed] = placeWords([{ id: 'a', lines: line('words'), places: ends }], [], bounds);
    expect(placed).toMatchObject({ anchor: 'end' });
  });

  it('never lets words that may be left out cover others', () => {
    const place = fc.record({
      x: fc.integer({ min: 0, max: 400 }),
      y: fc.integer({ min: 0, max: 190 }),
      anchor: fc.constantFrom('start' as const, 'middle' as const, 'end' as const),
    });
    const words = fc.record({
      text: fc.string({ minLength: 1, maxLength: 20 }),
      places: fc.array(place, { minLength: 1, maxLength: 6 }),
    });
    fc.assert(
      fc.property(fc.array(words, { maxLength: 8 }), (wanted) => {
        const placed = placeWords(
          wanted.map(({ text, places }, index) => ({ id: `${index}`, lines: line(text), places, mayBeLeftOut: true })),
          [],
          bounds,
        );
        const boxes = placed.map((words) => boxOf(words.lines, words));
        boxes.forEach((box, index) =>
          boxes.slice(index + 1).forEach((other) => expect(overlap(box, other)).toBe(false)),
        );
      }),
    );
  });
});
