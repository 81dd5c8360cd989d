import { z } from 'zod';
import { instantSchema } from './time';

/** Of a test strip, of a product's label, or of a piece of equipment. */
export const photoKinds = ['strip', 'label', 'equipment'] as const;
export type PhotoKind = (typeof photoKinds)[number];

/** The most that is taken in, and the most that is kept of it with its small copy [bytes]. */
export const MOST_PHOTO_BYTES = 8 * 1024 * 1024;
export const MOST_KEPT_BYTES = 400_000;
/** What a household may keep; a demo household is anybody's. */
export const MOST_PHOTOS = 300;
export const MOST_DEMO_PHOTOS = 3;
/** What browsers show and the server can read. */
export const photoTypes = ['image/jpeg', 'image/png', 'image/webp'] as const;

const MOST_IN_A_CAPTION = 120;

const captionSchema = z
  .string()
  .trim()
  .max(MOST_IN_A_CAPTION, `Keep the words to ${MOST_IN_A_CAPTION} characters.`)
  .transform((words) => (words === '' ? undefined : words))
  .optional();

/** The one description of a photo that is handed in. The id is made on the device, so that a resend is the same photo. */
export const newPhotoSchema = z
  .strictObject({
    id: z.uuid(),
    kind: z.enum(photoKinds),
    /** The reading that the strip belongs to, or the product that the label is on. */
    about: z.string().min(1).max(64).optional(),
    caption: captionSchema,
    bytes: z.instanceof(Uint8Array),
  })
  .superRefine(({ kind, about }, context) => {
    if ((kind === 'equipment') === (about === undefined)) return;
    const message =
      kind === 'equipment' ? 'A piece of equipment stands for itself.' : 'Say what this photo belongs to.';
    context.addIssue({ code: 'custom', path: ['about'], message });
  });
export type NewPhoto = z.output<typeof newPhotoSchema>;

/** A photo without its picture, which is fetched by its id. */
export const photoSchema = z.object({
  id: z.uuid(),
  kind: z.enum(photoKinds),
  about: z.string().nullable(),
  caption: z.string().nullable(),
  /** Of the picture as it is kept [px]. */
  width: z.number().int(),
  height: z.number().int(),
  addedAt: instantSchema,
  addedBy: z.string().nullable(),
  /** Whether whoever asks may take it away. */
  removable: z.boolean(),
});
export type Photo = z.infer<typeof photoSchema>;

/** The newest first. */
export const photosSchema = z.array(photoSchema);

/** Which copy of a photo is wanted. */
export const photoSizeSchema = z.strictObject({ size: z.enum(['whole', 'small']).default('whole') });
export type PhotoSize = z.output<typeof photoSizeSchema>['size'];
