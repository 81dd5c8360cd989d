import { classNames } from './class-names';

export type ButtonVariant = 'primary' | 'outline' | 'quiet' | 'terra';
export type ButtonSize = 'small' | 'normal' | 'large';

const shared = 'inline-flex items-center justify-center gap-2 rounded border-control text-center select-none';

const variants: Record<ButtonVariant, string> = {
  primary: 'border-ink bg-ink text-on-ink hover:bg-ink-2 hover:border-ink-2',
  outline: 'border-ink bg-transparent text-ink hover:bg-paper-lift',
  quiet:
    'border-transparent bg-transparent text-ink underline decoration-1 underline-offset-[3px] hover:decoration-2 focus-visible:no-underline',
  terra: 'border-terra-button bg-terra-button text-on-terra hover:border-terra-ink print:border-ink',
};

const sizes: Record<ButtonSize, string> = {
  // 36 px where a fine pointer is at hand, the full target where it is a finger.
  small: 'min-h-9 pointer-coarse:min-h-11 text-label font-control',
  normal: 'min-h-11 text-control',
  large: 'min-h-13 text-field font-control',
};

const padding: Record<ButtonSize, string> = { small: 'px-3', normal: 'px-4', large: 'px-5' };

const off = 'border-dashed border-rule-2 bg-transparent text-ink-3';

/** The look of a button, for whatever element is one: `<Link className={buttonClass({ variant: 'primary' })}>`. */
export function buttonClass(look: {
  variant?: ButtonVariant | undefined;
  size?: ButtonSize | undefined;
  off?: boolean | undefined;
  wide?: boolean | undefined;
  className?: string | undefined;
}): string {
  const { variant = 'outline', size = 'normal' } = look;
  return classNames(
    shared,
    sizes[size],
    look.off ? off : variants[variant],
    look.off ? 'cursor-not-allowed' : 'cursor-pointer',
    variant === 'quiet' ? 'px-1.5' : padding[size],
    look.wide && 'w-full',
    look.className,
  );
}
