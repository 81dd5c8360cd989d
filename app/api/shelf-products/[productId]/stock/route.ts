import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { householdProductSchema, productPathSchema, stockCountSchema } from '@/lib/schemas/household-product';
import { countStock } from '@/lib/services/count-stock';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  PUT: householdRoute({
    may: 'count-stock',
    input: stockCountSchema,
    params: productPathSchema,
    reply: householdProductSchema,
    handle: (context, { stock }, { productId }) => countStock(context, { id: productId, stock }),
  }),
});
