import Link from 'next/link';
import type { ComponentProps } from 'react';
import { type ButtonLook, type ButtonSize, buttonLook } from './button-look';

type LinkButtonProps = ComponentProps<typeof Link> & { look?: ButtonLook; size?: ButtonSize };

/** Goes somewhere, and looks like the thing to do next. */
export function LinkButton({ look = 'fill', size = 'desk', className, ...rest }: LinkButtonProps) {
  return <Link className={buttonLook(look, size, className)} {...rest} />;
}
