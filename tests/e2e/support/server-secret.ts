/** Known here, so that it can be looked for where it must not be. */
export const serverSecret = 'a secret of the end-to-end tests and of nothing else';
