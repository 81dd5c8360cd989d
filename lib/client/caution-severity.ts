/** How much harm a caution keeps away: for pages that show one before its procedure has begun. */
export { severityOf } from '@/lib/situations/codes';
