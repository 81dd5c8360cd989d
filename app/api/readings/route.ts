import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { newReadingSchema, recordedReadingSchema } from '@/lib/schemas/reading';
import { readingListQuerySchema, readingListSchema } from '@/lib/schemas/reading-list';
import { listReadings } from '@/lib/services/list-readings';
import { recordReading } from '@/lib/services/record-reading';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({
    may: 'look',
    input: readingListQuerySchema,
    reply: readingListSchema,
    handle: listReadings,
  }),
  POST: householdRoute({
    may: 'enter-tests',
    input: newReadingSchema,
    reply: recordedReadingSchema,
    handle: recordReading,
  }),
});
