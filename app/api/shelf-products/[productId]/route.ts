import { methods } from '@/lib/api/methods';
import { householdRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { productPathSchema } from '@/lib/schemas/household-product';
import { removeShelfProduct } from '@/lib/services/remove-shelf-product';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: householdRoute({
    may: 'change-shelf',
    params: productPathSchema,
    reply: doneSchema,
    handle: (context, _input, { productId }) => removeShelfProduct(context, { id: productId }),
  }),
});
