declare const proven: unique symbol;
declare const system: unique symbol;

/**
 * The id of a household that the asking person was shown to belong to at this request. Only `lib/auth` makes one, so a
 * query that takes it cannot be handed an id straight from a request.
 */
export type ProvenHouseholdId = string & { readonly [proven]: 'household' };

/** Leave to work across households, for the server's own tasks (start, sign-up, clean-up). Only `lib/auth` makes one. */
export type SystemScope = { readonly [system]: true; readonly task: SystemTask };

export type SystemTask = 'sign-up' | 'sign-in' | 'invitation' | 'mail' | 'seed-demo' | 'clean-up' | 'leaving';
