/** How a household writes days, and what whoever looks may do in it. */
export type HouseholdSetting = {
  timeZone: string;
  locale: string;
  mayInvite: boolean;
  mayHandOver: boolean;
  mayReadAuditTrail: boolean;
  demo: boolean;
};
