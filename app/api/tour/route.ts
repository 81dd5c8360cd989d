import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { tourSchema } from '@/lib/schemas/tour';
import { closeTour } from '@/lib/services/close-tour';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: personRoute({ input: tourSchema, reply: doneSchema, handle: closeTour }),
});
