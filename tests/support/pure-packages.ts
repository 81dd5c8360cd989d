/**
 * The packages that the pure folders may import: no input or output, no clock, no chance, and they run in a browser.
 * A package joins the list with the reason why it fits.
 */
export const purePackages = [
  {
    name: 'zod',
    folders: ['schemas'],
    reason: 'Checks plain data against a description; asks for no time and touches nothing outside its argument.',
  },
  {
    name: 'suncalc',
    folders: ['sun'],
    reason: 'Position of the sun from a date and a place that are both passed in; the same answer in every time zone.',
  },
  {
    name: 'temporal-polyfill',
    folders: ['calendar'],
    reason:
      'Zone arithmetic with a stated choice for gaps and folds; ESLint refuses the part of it that asks the clock.',
  },
] as const;
