import 'server-only';
import { logFault } from '@/lib/log';
import { planWeek, type PlanningContext } from './plan-week';

/** After something was saved: whatever becomes of the plan, what was saved stays and the person is told so. */
export async function bringPlanUpToDate(context: PlanningContext): Promise<void> {
  try {
    await planWeek(context);
  } catch (error) {
    logFault(error, { task: 'plan-week', householdId: context.access.householdId });
  }
}
