/** A link within words: a thin line under it, a thicker one under the pointer. */
export const textLink = 'underline decoration-1 underline-offset-[3px] hover:decoration-2';
