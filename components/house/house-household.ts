/** What the house notes need to know of their household and of who looks at them. */
export type HouseHousehold = {
  timeZone: string;
  locale: string;
  mayKeepHouseNotes: boolean;
};
