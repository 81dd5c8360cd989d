import type { Config } from 'tailwindcss';

/**
 * The tokens of the visual language. Nothing of Tailwind's own palette, type or shadows is left, so a colour that is not
 * a token cannot be written. The values of both themes stand in app/globals.css as variables of the same name; sizes that
 * differ between a phone and a desk are variables too, so `text-body` is 16/23 on one and 14/20 on the other.
 */
const token = (name: string) => `var(--${name})`;

const colours = [
  'paper',
  'paper-past',
  'paper-lift',
  'ink',
  'ink-2',
  'ink-3',
  'rule',
  'rule-2',
  'edge',
  'water',
  'water-2',
  'wave',
  'night',
  'teal',
  'teal-ink',
  'band',
  'plum',
  'plum-ink',
  'plum-band',
  'ochre',
  'ochre-ink',
  'ochre-band',
  'terra',
  'terra-ink',
  'terra-button',
  'care-wash',
  'on-ink',
  'on-terra',
] as const;

type TypeStyle = { weight?: string; tracking?: string };

/** A size of the type scale; its figures are variables because they change at the desk's width. */
const size = (name: string, style: TypeStyle = {}): [string, Record<string, string>] => [
  token(`size-${name}`),
  {
    lineHeight: token(`leading-${name}`),
    ...(style.weight === undefined ? {} : { fontWeight: style.weight }),
    ...(style.tracking === undefined ? {} : { letterSpacing: style.tracking }),
  },
];

export default {
  content: ['./app/**/*.tsx', './components/**/*.tsx'],
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      inherit: 'inherit',
      ...Object.fromEntries(colours.map((name) => [name, token(name)])),
    },
    screens: { sm: '600px', md: '900px', lg: '1280px' },
    fontFamily: {
      body: '"Atkinson Hyperlegible Next Variable", "Atkinson Hyperlegible Next Variable Extended", system-ui, sans-serif',
      display: '"Fraunces Variable", "Fraunces Variable Extended", Georgia, serif',
    },
    fontSize: {
      landing: size('landing', { weight: '560', tracking: '-0.024em' }),
      headline: size('headline', { weight: '560', tracking: '-0.018em' }),
      verdict: size('verdict', { weight: '560', tracking: '-0.018em' }),
      board: size('board', { weight: '570', tracking: '-0.018em' }),
      sentence: size('sentence', { weight: '420' }),
      lead: size('lead', { weight: '420' }),
      section: size('section', { weight: '540' }),
      name: size('name', { weight: '540' }),
      brand: size('brand', { weight: '480', tracking: '-0.005em' }),
      dose: size('dose', { weight: '560', tracking: '-0.015em' }),
      field: size('field'),
      control: size('control', { weight: '620' }),
      body: size('body'),
      label: size('label'),
      small: size('small'),
      fine: size('fine'),
      chart: size('chart', { weight: '500' }),
      figure: size('figure', { weight: '500' }),
    },
    fontWeight: {
      lead: '420',
      text: '450',
      chart: '500',
      section: '540',
      headline: '560',
      control: '620',
      emphasis: '650',
      strong: '680',
      severity: '760',
    },
    letterSpacing: { normal: '0', headline: '-0.018em', dose: '-0.015em' },
    borderRadius: { none: '0', DEFAULT: '4px', tick: '3px', full: '9999px' },
    borderWidth: { DEFAULT: '1px', 0: '0', todo: '1.4px', control: '1.5px', due: '2px', stop: '2.5px', care: '6px' },
    boxShadow: { none: 'none' },
    dropShadow: { none: 'none' },
    backgroundImage: {
      none: 'none',
      'hatch-stop': 'repeating-linear-gradient(135deg, var(--terra-ink) 0 4px, transparent 4px 9px)',
      'hatch-ink': 'repeating-linear-gradient(135deg, var(--rule-2) 0 1px, transparent 1px 7px)',
    },
    transitionDuration: { tick: '120ms', expand: '200ms', morph: '240ms' },
    extend: {
      spacing: { margin: 'var(--page-margin)', tabs: '72px' },
      maxWidth: { sheet: '1440px', reading: '44rem', form: '27rem' },
    },
  },
} satisfies Config;
