import type { ReactNode } from 'react';
import { type ButtonLook, buttonLook } from '@/components/ui/button-look';
import { type BookPlace, placeHref } from './book-place';

/**
 * Goes to another place of the book. A plain link: the framework's own would change the address without
 * telling anybody that listens to it.
 */
export function PlaceButton({
  place,
  look = 'fill',
  children,
}: {
  place: BookPlace;
  look?: ButtonLook;
  children: ReactNode;
}) {
  return (
    <a href={placeHref(place)} className={buttonLook(look, 'thumb')}>
      {children}
    </a>
  );
}
