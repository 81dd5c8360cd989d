import { z } from 'zod';
import { instantSchema } from './time';

export const browsers = ['chrome', 'edge', 'firefox', 'opera', 'safari', 'samsung-internet'] as const;
export const systems = ['android', 'chrome-os', 'ipad', 'iphone', 'linux', 'mac', 'windows'] as const;

/** What somebody signed in with, as far as it is known; each word of a closed list. */
const deviceSchema = z.object({ browser: z.enum(browsers).nullable(), system: z.enum(systems).nullable() });
export type Device = z.infer<typeof deviceSchema>;

/** A device on which a person is signed in. */
const signedInDeviceSchema = z.object({
  /** Neither the cookie nor what is stored of it: it serves to sign out there and for nothing else. */
  id: z.string(),
  device: deviceSchema.nullable(),
  /** The one that asks. */
  current: z.boolean(),
  startedAt: instantSchema.nullable(),
  lastSeenAt: instantSchema.nullable(),
});
export const signedInDevicesSchema = z.array(signedInDeviceSchema);
export type SignedInDevice = z.infer<typeof signedInDeviceSchema>;

export const deviceIdSchema = z.strictObject({ id: z.string().min(1).max(64) });
