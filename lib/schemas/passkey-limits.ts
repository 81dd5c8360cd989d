/** Apart from the schema, so that a page that names them does not bring zod. */
export const MOST_PASSKEYS = 10;
export const MOST_NAME_LENGTH = 80;
