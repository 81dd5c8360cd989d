/** The reply of what only has to be done. */
export const doneReply = () => import('@/lib/schemas/account').then(({ doneSchema }) => doneSchema);
