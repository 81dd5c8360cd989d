import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { houseNotesSchema, newHouseNotesSchema } from '@/lib/schemas/house-note';
import { saveHouseNotes } from '@/lib/services/save-house-notes';
import { showHouseNotes } from '@/lib/services/show-house-notes';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: houseNotesSchema, handle: showHouseNotes }),
  PUT: householdRoute({
    may: 'keep-house-notes',
    input: newHouseNotesSchema,
    reply: houseNotesSchema,
    handle: saveHouseNotes,
  }),
});
