import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { idSchema } from '@/lib/schemas/id';
import { newReadingSchema, recordedReadingSchema } from '@/lib/schemas/reading';
import { editReading, removeReading } from '@/lib/services/edit-reading';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: householdRoute({
    may: 'enter-tests',
    params: idSchema,
    input: newReadingSchema,
    reply: recordedReadingSchema,
    handle: (context, reading, { id }) => editReading(context, id, reading),
  }),
  DELETE: householdRoute({
    may: 'enter-tests',
    params: idSchema,
    reply: idSchema,
    handle: (context, _nothing, { id }) => removeReading(context, id),
  }),
});
