import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { WeekPrintPage } from '@/components/week-print/week-print-page';
import words from '@/lib/messages/en/week-print.json';
import type { PrintedWeek } from '@/lib/schemas/printed-week';
import { type WeekSheet, weekSheetSchema } from '@/lib/schemas/week-sheet';
import { aSituations } from '@/tests/support/situations';
import { aWeekSheet, idOf, type WeekOptions } from '@/tests/support/week-sheet';
import { renderWithWords } from '@/tests/support/with-words';

function show(week: Partial<WeekSheet> = {}, printed: Partial<PrintedWeek> = {}, options: WeekOptions = {}) {
  const sheet = weekSheetSchema.parse(aWeekSheet(options, week));
  const openDoses = sheet.doses.filter(({ status }) => status === 'planned').map(({ at }) => at);
  renderWithWords(<WeekPrintPage printed={{ week: sheet, notes: {}, openDoses, ...printed }} start={undefined} />);
  return sheet;
}

const open = (sheet: WeekSheet) => sheet.doses.filter(({ status }) => status === 'planned');
const page = () => document.body.textContent ?? '';

describe('the week on paper', () => {
  it('says what is still to be done, and counts what stands below', () => {
    const sheet = show();
    expect(open(sheet)).toHaveLength(3);
    expect(
      screen.getByRole('heading', { level: 2, name: 'Three doses, two quick checks, one full test.' }),
    ).toBeVisible();
    expect(screen.getAllByText('added')).toHaveLength(3);
    const openChecks = screen.getAllByText((_, element) => /^Quick check by [\d:]+$/.test(element?.textContent ?? ''));
    expect(openChecks.filter(({ tagName }) => tagName === 'SPAN')).toHaveLength(2);
    expect(screen.getAllByText('then a new page')).toHaveLength(1);
  });

  it('prints the verdict with the moment it was made, sends to the sheet for it, and its standing line', () => {
    show();
    expect(page()).toContain('The water is fine for swimming until Thursday evening.');
    expect(page()).toMatch(
      /Worked out Wednesday 8 July, 10:20, for that moment only: .* Look there before anyone goes in\./,
    );
    expect(screen.getByText('Before anyone goes in:')).toBeVisible();
  });

  it('says until when it is good and what ends it', () => {
    show();
    expect(page()).toContain('Made Wednesday 8 July, 10:20; good until Thursday 9 July, 19:00.');
    expect(page()).toContain(words.why.quick);
    expect(page()).toContain('Before pouring, check on the sheet that no one has ticked the dose.');
    expect(page()).toContain('Good until here.');
  });

  it('prints the amounts in the units of the household', () => {
    const metric = aWeekSheet();
    show({ household: { ...metric.household, unitSystem: 'us', locale: 'en-US' } });
    expect(page()).toContain('ppm');
    expect(page()).toMatch(/\d(\.\d)? oz/);
    expect(page()).not.toMatch(/\d g\b/);
    expect(page()).toMatch(/PM/);
  });

  it('has the steps of the next dose, in their order, and the Stop', () => {
    show();
    const steps = screen.getByRole('heading', { name: words.how['granules-dissolve'] }).parentElement!;
    const lines = within(steps)
      .getAllByRole('listitem')
      .map(({ textContent }) => textContent);
    expect(lines).toHaveLength(6);
    expect(lines[0]).toContain('Goggles and gloves on');
    expect(lines[1]).toContain('Pump on now');
    expect(lines[5]).toContain('Nobody in until the morning.');
    expect(screen.getByText(/^Never let two different pool products touch/)).toBeVisible();
    expect(page()).toContain('Smoke, hissing, heat, sharp smell:');
  });

  it('names whom to ring, as far as it is written down', () => {
    show(
      {},
      { notes: { ourPhone: '555 0100', professionalName: 'The firm in the lane', professionalPhone: '555 0199' } },
    );
    expect(screen.getByText('In doubt: us 555 0100, The firm in the lane 555 0199')).toBeVisible();
  });

  const nothingFrom = (sheet: WeekSheet, reason: string) => {
    expect(screen.getByRole('heading', { level: 2, name: words.asks.barred })).toBeVisible();
    expect(page()).toContain(reason);
    expect(page()).not.toContain('good until');
    expect(screen.queryByText('added')).toBeNull();
    expect(screen.queryByRole('heading', { name: words.how['granules-dissolve'] })).toBeNull();
    for (const { amount } of open(sheet)) expect(page()).not.toContain(`${amount} g`);
  };

  it('names no amount while a dose is overdue', () => {
    const sheet = show({}, { openDoses: ['2026-07-07T19:40:00+02:00'] });
    nothingFrom(sheet, words.bar.dose);
  });

  it('names no amount of a plan that no longer fits', () => {
    const sheet = show({ plan: { ...aWeekSheet().plan!, stale: true } });
    nothingFrom(sheet, words.bar.noPlan);
  });

  it('names no amount while something that happened bars dosing', () => {
    const happenedAt = '2026-07-08T09:00:00+02:00';
    const sheet = show({ events: [{ id: idOf(7), kind: 'drain-cover', happenedAt, reportedBy: 'Ines' }] });
    expect(screen.getByRole('heading', { level: 2, name: words.asks.barred })).toBeVisible();
    expect(page()).not.toMatch(/good until/i);
    expect(screen.queryByText('added')).toBeNull();
    for (const { amount } of open(sheet)) expect(page()).not.toContain(`${amount} g`);
  });

  it('says that the first test makes the first page', () => {
    show(
      { plan: null, lastReading: null, readings: [], doses: [], checks: [], ahead: null, behind: null },
      { openDoses: [] },
    );
    expect(page()).toContain(words.bar.untested);
  });

  it('says of an open situation that it leads', () => {
    show({ situation: aSituations({ kind: 'quick-raise', procedure: { lead: 'treat' } }).open });
    expect(page()).toMatch(/ is open and leads this week\./);
  });

  it('keeps a week that is over as a record', () => {
    show({}, { openDoses: [] }, { now: ['2026-07-14', '10:00'] });
    expect(screen.getByRole('heading', { level: 2, name: words.asks.past })).toBeVisible();
    expect(page()).toContain(words.bar.past);
    expect(screen.queryByText('added')).toBeNull();
  });

  it('calls nothing safe', () => {
    expect(JSON.stringify(words)).not.toMatch(/\bsafe\b/i);
  });
});
