import { classNames } from '@/components/ui/class-names';

type Props = Omit<React.ComponentProps<'text'>, 'className'> & {
  weight?: keyof typeof weights;
  /** What lies behind the words, so that no line runs through them. */
  ground?: keyof typeof grounds;
  anchor?: 'start' | 'middle' | 'end';
};

const weights = {
  plain: 'fill-ink-2 text-chart',
  figure: 'fill-ink text-chart font-strong',
  name: 'fill-teal-ink font-display text-name font-headline',
  smallName: 'fill-teal-ink text-chart font-strong',
  title: 'fill-ink font-display text-name',
};

const grounds = { paper: 'stroke-paper', water: 'stroke-water-2', care: 'stroke-care-wash' };

/** Words in a drawing, with a halo of the ground they stand on. */
export function DrawingText({ weight = 'figure', ground = 'paper', anchor = 'start', ...text }: Props) {
  return (
    <text
      {...text}
      textAnchor={anchor}
      strokeWidth="4"
      strokeLinejoin="round"
      className={classNames(weights[weight], grounds[ground], '[paint-order:stroke]')}
    />
  );
}
