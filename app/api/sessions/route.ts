import { methods } from '@/lib/api/methods';
import { personRoute } from '@/lib/api/routes';
import { doneSchema } from '@/lib/schemas/account';
import { signedInDevicesSchema } from '@/lib/schemas/device';
import { signOutElsewhere } from '@/lib/services/change-password';
import { showDevices } from '@/lib/services/show-devices';

export const { GET, POST, PUT, PATCH, DELETE } = methods({
  GET: personRoute({ reply: signedInDevicesSchema, handle: showDevices }),
  // All but the one that asks.
  DELETE: personRoute({ reply: doneSchema, handle: signOutElsewhere }),
});
