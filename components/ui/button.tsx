'use client';

import { useId } from 'react';
import { buttonClass, type ButtonSize, type ButtonVariant } from './button-class';
import { UNHEARD } from './early-presses';
import { Spinner } from './spinner';
import { useEarlyPress } from './use-early-press';
import { useHydrated } from './use-hydrated';

export type ButtonProps = Omit<React.ComponentProps<'button'>, 'disabled'> & {
  variant?: ButtonVariant;
  size?: ButtonSize;
  wide?: boolean;
  /** What is happening right now ("Saving"): takes the place of the label and swallows further clicks. */
  busy?: string | undefined;
  /** Why the button is off. Stands under it and is read out with it. */
  offReason?: string | undefined;
  /** The id of an element elsewhere on the page that says why the button is off. */
  offReasonId?: string | undefined;
};

/**
 * A button that is off keeps its place in the tab order: someone who cannot see the dashes must be able to reach the
 * reason. Hence `aria-disabled` and not `disabled`.
 */
export function Button(props: ButtonProps) {
  const { variant, size, wide, busy, offReason, offReasonId, className, children, onClick, type, ref, ...rest } = props;
  const ownReasonId = useId();
  const hydrated = useHydrated(type === 'submit');
  const pressed = useEarlyPress(ref);
  const off = offReason !== undefined || offReasonId !== undefined;
  const inert = off || busy !== undefined;
  const reasonId = offReason === undefined ? offReasonId : ownReasonId;

  const button = (
    <button
      {...rest}
      {...{ [UNHEARD]: '' }}
      ref={pressed}
      type={type ?? 'button'}
      // Sent before React listens, a form would leave the page and lose what was typed.
      disabled={!hydrated}
      className={buttonClass({ variant, size, off, wide, className })}
      aria-disabled={inert || undefined}
      aria-busy={busy === undefined ? undefined : true}
      aria-describedby={reasonId ?? rest['aria-describedby']}
      onClick={(event) => {
        if (inert) event.preventDefault();
        else onClick?.(event);
      }}
    >
      {busy === undefined ? (
        children
      ) : (
        <>
          <Spinner />
          {busy}
        </>
      )}
    </button>
  );

  if (offReason === undefined) return button;
  return (
    <span className={wide ? 'grid gap-1.5' : 'inline-grid justify-items-start gap-1.5'}>
      {button}
      <span id={ownReasonId} className="text-small text-ink-2">
        {offReason}
      </span>
    </span>
  );
}
