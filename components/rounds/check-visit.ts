import { checkAnswers } from '@/components/pool/field-problems';
import { newVisitSchema } from '@/lib/schemas/visit';

/** The visit if it is sound, and what is said at which field if it is not. */
export function checkVisit(visit: unknown) {
  return checkAnswers(newVisitSchema, visit);
}
