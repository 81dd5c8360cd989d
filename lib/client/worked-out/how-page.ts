/** The pages of "how it is worked out", in the order of their list; each is an address below /help/how. */
export const howPages = [
  'free-chlorine',
  'chlorine-forms',
  'stabilizer',
  'sun',
  'tablets',
  'swimmers',
  'combined-chlorine',
  'ph',
  'alkalinity',
  'calcium',
  'likely-range',
  'learning',
  'liquid-strength',
  'volume',
  'evaporation',
] as const;

export type HowPage = (typeof howPages)[number];

export function isHowPage(name: string): name is HowPage {
  return (howPages as readonly string[]).includes(name);
}
