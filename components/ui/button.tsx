import type { ComponentProps, ReactNode } from 'react';
import { type ButtonLook, type ButtonSize, buttonLook } from './button-look';
import { KeyHint } from './key-hint';

export type ButtonProps = ComponentProps<'button'> & {
  look?: ButtonLook;
  size?: ButtonSize;
  /** What is being done, while it is: "Booking…". The button keeps the focus and takes no second press. */
  busyText?: ReactNode;
  /** The key that does the same. */
  keyName?: string;
};

export function Button({
  look = 'fill',
  size = 'desk',
  busyText,
  keyName,
  className,
  children,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    <button
      type={type}
      aria-busy={busyText ? true : undefined}
      aria-disabled={busyText ? true : undefined}
      className={buttonLook(look, size, className)}
      onClick={busyText ? (event) => event.preventDefault() : onClick}
      {...rest}
    >
      {busyText ?? children}
      {keyName ? <KeyHint keys={keyName} isOnFill={look === 'fill'} /> : null}
    </button>
  );
}
