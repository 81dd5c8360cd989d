import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { householdProductListSchema, householdProductSchema } from '@/lib/schemas/household-product';
import { listShelfProducts } from '@/lib/services/list-shelf-products';
import { saveShelfProduct } from '@/lib/services/save-shelf-product';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: householdRoute({ may: 'look', reply: householdProductListSchema, handle: listShelfProducts }),
  POST: householdRoute({
    may: 'change-shelf',
    input: householdProductSchema,
    reply: householdProductSchema,
    handle: saveShelfProduct,
  }),
});
