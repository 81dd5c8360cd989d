import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { HouseSheetPage } from '@/components/house/house-sheet-page';
import words from '@/lib/messages/en/house.json';
import type { HouseSheet } from '@/lib/schemas/house-sheet';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { aWeekSheet, idOf } from '@/tests/support/week-sheet';
import { renderWithWords } from '@/tests/support/with-words';

const joost = { membershipId: 'joost', name: 'Joost' };

function show(changes: Partial<HouseSheet> = {}, week: Partial<WeekSheet> = {}) {
  const sheet = aWeekSheet({}, week);
  renderWithWords(
    <HouseSheetPage
      sheet={{ week: sheet, notes: {}, handlers: [joost], handler: null, doses: [], openDoses: 0, ...changes }}
    />,
  );
  return sheet;
}

function aDose(changes: Partial<PlanDose>): PlanDose {
  const dose = aWeekSheet().doses.find(({ form, status }) => form === 'granular' && status === 'planned');
  if (!dose) throw new Error('The sheet of the tests has granules to come');
  return { ...dose, ...changes };
}

const part = (name: string) => within(screen.getByRole('region', { name }));

describe('the house sheet', () => {
  it('says to add nothing and where no chemicals are, to whoever is not named', () => {
    show({ notes: { chemicals: 'Grey locker', gate: 'Key in the shed' } });
    expect(part('Doses').getByText('Add nothing; call us.')).toBeInTheDocument();
    expect(part('Where things are').getByText('Key in the shed')).toBeInTheDocument();
    expect(screen.queryByText('Grey locker')).toBeNull();
    expect(screen.queryByText(/scoop/)).toBeNull();
    expect(part('Doses').queryByRole('listitem')).toBeNull();
    expect(part('Doses').getByText(/Nothing goes into the skimmer, never two products together/)).toBeInTheDocument();
  });

  it('gives the named one dated doses as scoops of the marked measure, or by weight where none fits', () => {
    const at = (day: number) => `2026-07-${String(day).padStart(2, '0')}T19:40:00+02:00`;
    show({
      handler: joost,
      notes: { chemicals: 'Grey locker' },
      doses: [
        aDose({ id: idOf(1), at: at(9), amount: 150, measure: 50 }),
        aDose({ id: idOf(2), at: at(10), amount: 130, measure: 50 }),
        aDose({ id: idOf(3), at: at(11), amount: 95, measure: null, toBuy: true }),
      ],
    });
    const [first, second, third] = part('Doses').getAllByRole('listitem');
    expect(first).toHaveTextContent('Thursday 9 July');
    expect(first).toHaveTextContent(/3 level scoops of granules, 50 g each, 150 g in all/);
    expect(first).toHaveTextContent('Nobody in until the morning.');
    expect(second).toHaveTextContent(/130 g granules/);
    expect(second).not.toHaveTextContent('scoop');
    expect(third).toHaveTextContent('To buy first.');
    expect(part('Doses').getByText('Only Joost,')).toBeInTheDocument();
    expect(screen.getByText('Grey locker')).toBeInTheDocument();
    expect(part('Doses').getByText(/Open the dose in Wadewell before you start/)).toBeInTheDocument();
  });

  it('says when it was made and until when it holds', () => {
    show({ handler: joost, doses: [aDose({})] });
    expect(screen.getByText(/^Made Wednesday 8 July, 10:20\. Good until Sunday 12 July, 19:00/)).toBeInTheDocument();
  });

  it('names the day of a wait: on paper no day is today', () => {
    // Soda that went in at ten of the day on which the sheet is made: the water is free the same afternoon.
    const soda = { substance: 'sodium-bicarbonate', form: 'other', steps: 'companion-dissolve' } as const;
    const hours = { at: '2026-07-08T10:30:00+02:00', waitUntil: '2026-07-08T12:30:00+02:00' };
    show({ handler: joost, doses: [aDose({ ...soda, ...hours })] });
    expect(part('Doses').getByText(/Wednesday/, { selector: 'p:last-child' })).toBeInTheDocument();
    expect(part('Doses').queryByText(/this (morning|afternoon|evening)|today|tonight/i)).toBeNull();
  });

  it('holds no dose where no plan does', () => {
    show({ handler: joost, doses: [] }, { plan: null });
    expect(screen.getByText('There is no plan that holds. Add nothing; call us.')).toBeInTheDocument();
  });

  it('a drain cover that is not whole bars every dose', () => {
    const event = {
      id: idOf(7),
      kind: 'drain-cover' as const,
      happenedAt: '2026-07-08T09:00:00+02:00',
      reportedBy: 'Ines',
    };
    show({ handler: joost, doses: [aDose({ measure: 50, amount: 150 })] }, { events: [event] });
    expect(part('Doses').getByText(/^Add nothing; call us\. /)).toBeInTheDocument();
    expect(screen.queryByText(/3 level scoops/)).toBeNull();
    expect(screen.queryByText(/Good until/)).toBeNull();
  });

  it('holds no dose where one may have gone in twice', () => {
    const doubted = aDose({ id: idOf(8), doubtful: true });
    show({ handler: joost, doses: [aDose({ measure: 50, amount: 150 })] }, { doses: [doubted] });
    expect(part('Doses').getByText(/^A dose may have gone in twice\./)).toBeInTheDocument();
    expect(screen.queryByText(/3 level scoops/)).toBeNull();
  });

  it('calls by number, leaves a line where nothing is written down, and never guesses an emergency number', () => {
    show({ notes: { neighbourName: 'Ada', neighbourPhone: '0170 555 01' } });
    expect(screen.getByRole('link', { name: 'Ada, 0170 555 01' })).toHaveAttribute('href', 'tel:017055501');
    expect(part('Call').getAllByText('not written down yet')).toHaveLength(2);
    // The household of these tests writes as in Britain.
    expect(screen.getByRole('link', { name: 'Emergency, 999' })).toHaveAttribute('href', 'tel:999');
    expect(part('Call').getByText(/^Numbers for the United Kingdom/)).toBeInTheDocument();
  });

  it('warns of a dose of which nobody said whether it went in', () => {
    show({ openDoses: 2 });
    expect(screen.getByText(/^2 doses are neither ticked nor skipped/)).toBeInTheDocument();
  });

  it('never calls anything safe, and keeps the order: who is held first, then everyone out, then the pump', () => {
    expect(JSON.stringify(words)).not.toMatch(/\bsafe\b/i);
    const said = words.sheet.trouble.drain;
    const order = ['held', 'pump off first', 'call emergency', 'everyone out', 'then pump off'].map((each) =>
      said.indexOf(each),
    );
    expect(order).toEqual(order.toSorted((a, b) => a - b));
    expect(Math.min(...order)).toBeGreaterThanOrEqual(0);
  });
});
