import { z } from 'zod';
import { passwordChangeSchema } from './account';
import { MOST_NAME_LENGTH } from './passkey-limits';
import { instantSchema } from './time';

/** Why this address of the product cannot have passkeys: opened by a number, or in the clear. */
export const passkeyObstacles = ['number', 'in-the-clear'] as const;
export type PasskeyObstacle = (typeof passkeyObstacles)[number];

const encoded = (most: number) =>
  z
    .string()
    .min(1)
    .max(most)
    .regex(/^[\w-]+$/);
/** The id that a device gives a passkey: 1,023 bytes at most. */
const passkeyIdSchema = encoded(1364);
/** What the browser says it was asked, and by which page. */
const clientDataSchema = encoded(4000);

/** A passkey by its id, from a path. */
export const passkeyPathSchema = z.strictObject({ id: passkeyIdSchema });

/** A passkey as its owner sees it. */
export const passkeySchema = z.object({
  id: passkeyIdSchema,
  name: z.string(),
  createdAt: instantSchema,
  lastUsedAt: instantSchema.nullable(),
});
export type Passkey = z.infer<typeof passkeySchema>;

export const passkeyListSchema = z.object({
  passkeys: z.array(passkeySchema),
  /** Why none can be added or used here; null where they can. */
  obstacle: z.enum(passkeyObstacles).nullable(),
});
export type PasskeyList = z.infer<typeof passkeyListSchema>;

/** Whoever adds a passkey shows that they know the password: a device left open is not enough. */
export const passkeyWishSchema = z.strictObject({ password: passwordChangeSchema.shape.current });
export type PasskeyWish = z.output<typeof passkeyWishSchema>;

/** What a device is asked when it makes a passkey. */
export const passkeyCreationSchema = z.object({
  rp: z.object({ id: z.string(), name: z.string() }),
  user: z.object({ id: z.string(), name: z.string(), displayName: z.string() }),
  challenge: z.string(),
  pubKeyCredParams: z.array(z.object({ type: z.literal('public-key'), alg: z.int() })),
  timeout: z.int(),
  attestation: z.literal('none'),
  excludeCredentials: z.array(
    z.object({ id: z.string(), type: z.literal('public-key'), transports: z.array(z.string()) }),
  ),
  authenticatorSelection: z.object({
    residentKey: z.literal('required'),
    requireResidentKey: z.literal(true),
    userVerification: z.literal('required'),
  }),
});
export type PasskeyCreation = z.infer<typeof passkeyCreationSchema>;

/** What a device answers, with what the person calls the passkey. */
export const newPasskeySchema = z.strictObject({
  name: z
    .string({ error: 'Write a name for the passkey.' })
    .trim()
    .min(1, 'Write a name for the passkey.')
    .max(MOST_NAME_LENGTH, 'Keep the name under 80 characters.'),
  id: passkeyIdSchema,
  clientDataJSON: clientDataSchema,
  attestationObject: encoded(40_000),
  transports: z.array(z.string().regex(/^[a-z-]{1,32}$/)).max(10),
});
export type NewPasskey = z.output<typeof newPasskeySchema>;

/** What a device is asked when somebody signs in. */
export const passkeyRequestSchema = z.object({
  rpId: z.string(),
  challenge: z.string(),
  timeout: z.int(),
  userVerification: z.literal('required'),
});
export type PasskeyRequest = z.infer<typeof passkeyRequestSchema>;

/** What a device answers: which passkey, whose, and the signature. */
export const passkeySignInSchema = z.strictObject({
  id: passkeyIdSchema,
  clientDataJSON: clientDataSchema,
  authenticatorData: encoded(4000),
  signature: encoded(8000),
  /** Empty from a device that does not say whose it is, which is refused like any other wrong answer. */
  userHandle: z
    .string()
    .max(100)
    .regex(/^[\w-]*$/),
});
export type PasskeySignIn = z.output<typeof passkeySignInSchema>;
