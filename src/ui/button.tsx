import type { ComponentProps, MouseEvent } from 'react';
import { buttonClass, type ButtonLook } from './button-class.ts';
import { Icon, type IconName } from './icon.tsx';
import { Spinner } from './spinner.tsx';

/** Props of {@link Button}; anything else goes to the button element. */
export interface ButtonProps extends ComponentProps<'button'>, ButtonLook {
  readonly icon?: IconName;
  /** While true the button shows that it works and takes no further press. */
  readonly busy?: boolean;
}

/**
 * A button. A `blocked` one stays in reach of the keyboard, takes no press, and its words say what it waits for
 * ("Flask out opens at 980 °C").
 */
export const Button = ({
  kind = 'plain',
  size = 'desk',
  icon,
  busy = false,
  className,
  children,
  onClick,
  ...rest
}: ButtonProps) => {
  const inert = busy || kind === 'blocked';
  const press = (event: MouseEvent<HTMLButtonElement>): void => {
    if (inert) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <button
      type="button"
      {...rest}
      onClick={press}
      aria-disabled={inert || undefined}
      aria-busy={busy || undefined}
      data-kind={kind}
      className={buttonClass({ kind, size }, className)}
    >
      {busy ? <Spinner /> : icon ? <Icon name={icon} /> : null}
      {children}
    </button>
  );
};
