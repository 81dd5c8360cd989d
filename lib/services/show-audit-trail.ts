import 'server-only';
import { listAudit } from '@/db/queries/audit-trail';
import { assertMay } from '@/lib/auth/permissions';
import { isCalendarDay } from '@/lib/calendar/household-day';
import { type AuditActor, type AuditEntryShown, type AuditPage, auditActions } from '@/lib/schemas/audit-entry';
import { roles } from '@/lib/schemas/week-sheet';
import type { ServiceContext } from './context';

const entriesOfAPage = 50;

/** Who changed what, newest first, fifty at a time. Of the details only what helps, and no ids. */
export async function showAuditTrail(
  { db, access }: ServiceContext,
  { before }: { before?: string | undefined },
): Promise<AuditPage> {
  assertMay(access, 'read-audit-trail');
  const rows = await listAudit(db, access.householdId, { before, most: entriesOfAPage + 1 });
  const page = rows.slice(0, entriesOfAPage);
  return {
    entries: page.flatMap((row) => {
      const action = auditActions.find((each) => each === row.action);
      return action === undefined ? [] : [{ ...shown(row), action }];
    }),
    before: rows.length > entriesOfAPage ? `${page.at(-1)?.id}` : null,
  };
}

type Row = Awaited<ReturnType<typeof listAudit>>[number];

function shown(row: Row): Omit<AuditEntryShown, 'action'> {
  const detail = row.detail ?? {};
  const { name, role, chemicalsAllowed, fromDay, untilDay } = detail;
  return {
    id: row.id,
    at: row.at.toISOString(),
    // No person in the row is the server itself; a person without a row, or with one that is given up, is gone.
    who: row.personId === null ? { kind: 'server' } : actorOf(row.personName, row.personDeletedAt),
    member: row.memberName === null ? null : actorOf(row.memberName, row.memberDeletedAt),
    named: typeof name === 'string' ? name : null,
    role: roles.find((each) => each === role) ?? null,
    chemicalsAllowed: typeof chemicalsAllowed === 'boolean' ? chemicalsAllowed : null,
    days: isDay(fromDay) && isDay(untilDay) ? { from: fromDay, until: untilDay } : null,
  };
}

function actorOf(name: string | null, deletedAt: Date | null): AuditActor {
  return name === null || deletedAt !== null ? { kind: 'former' } : { kind: 'person', name };
}

const isDay = (value: unknown): value is string => typeof value === 'string' && isCalendarDay(value);
