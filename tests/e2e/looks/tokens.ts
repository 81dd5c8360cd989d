/** The tokens of the visual language as it prints them, light and dark: nothing else may be seen on any page. */
const tokens = {
  paper: ['#F7F4EC', '#0F232B'],
  'paper-past': ['#F1ECDF', '#0B1C23'],
  'paper-lift': ['#FDFBF5', '#16303A'],
  ink: ['#12303A', '#F1EDE0'],
  'ink-2': ['#3F565D', '#C0CCC8'],
  'ink-3': ['#566A70', '#9DAFAE'],
  rule: ['rgba(18,48,58,.17)', 'rgba(241,237,224,.15)'],
  'rule-2': ['rgba(18,48,58,.42)', 'rgba(241,237,224,.40)'],
  edge: ['rgba(18,48,58,.60)', 'rgba(241,237,224,.50)'],
  water: ['#CFE6E4', '#1D4A51'],
  'water-2': ['#DFEDE8', '#15353D'],
  // The engraved waves of the good range: teal at .26.
  wave: ['rgba(14,124,134,.26)', 'rgba(94,196,198,.26)'],
  night: ['rgba(18,48,58,.055)', 'rgba(2,10,14,.34)'],
  teal: ['#0E7C86', '#5EC4C6'],
  'teal-ink': ['#0A6670', '#7FD3D4'],
  band: ['rgba(14,124,134,.24)', 'rgba(94,196,198,.27)'],
  plum: ['#6B4C7A', '#C7A6DB'],
  'plum-ink': ['#5E416C', '#D2B6E3'],
  'plum-band': ['rgba(107,76,122,.17)', 'rgba(199,166,219,.22)'],
  ochre: ['#AE7E22', '#E0B45A'],
  'ochre-ink': ['#76540F', '#E8C378'],
  'ochre-band': ['rgba(185,134,43,.20)', 'rgba(224,180,90,.20)'],
  terra: ['#C8553D', '#F0886A'],
  'terra-ink': ['#A33B24', '#F7A58C'],
  'care-wash': ['#F3EAD2', '#332C1B'],
  'on-ink': ['#F7F4EC', '#0F232B'],
  // Not in its table: the words on a button of alarm, from the style sheet of the pictures.
  'on-terra': ['#FFFFFF', '#1D0F0A'],
} as const;

export type Theme = 'light' | 'dark';

/** The colours of a theme as red, green, blue, alpha. */
export function coloursOf(theme: Theme): number[][] {
  return Object.values(tokens).map((pair) => channels(pair[theme === 'light' ? 0 : 1]));
}

function channels(colour: string): number[] {
  if (colour.startsWith('#')) return [1, 3, 5].map((at) => Number.parseInt(colour.slice(at, at + 2), 16)).concat(1);
  return (colour.match(/[\d.]+/g) ?? []).map(Number);
}

/** The two families that are shipped. */
export const families = ['Fraunces Variable', 'Atkinson Hyperlegible Next Variable'];
