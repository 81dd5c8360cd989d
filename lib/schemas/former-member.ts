/** What is kept as the name of somebody whose account is gone, while a household still refers to them. */
export const formerMember = 'former member';
