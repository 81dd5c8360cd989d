import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { deviceIdSchema, signedInDevicesSchema } from '@/lib/schemas/device';
import { signOutDevice } from '@/lib/services/sign-out-device';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  DELETE: personRoute({
    params: deviceIdSchema,
    reply: signedInDevicesSchema,
    handle: (visit, _, device) => signOutDevice(visit, device),
  }),
});
