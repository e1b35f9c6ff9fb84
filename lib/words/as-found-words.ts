/** How readings as found are told against the sheet. Spanish is recalled. */
import type { CrewLanguage } from './crew';

export type AsFoundWords = {
  corner: (name: string) => string;
  fall: string;
  differs: (what: string, found: string, onSheet: string) => string;
  filler: (
    run: string,
    filler: { end: 'left' | 'right'; by: string; isNarrower: boolean },
  ) => string;
  kick: (run: string, kick: { by: string; isHigher: boolean }) => string;
};

export const asFoundWords: Record<CrewLanguage, AsFoundWords> = {
  en: {
    corner: (name) => `Corner ${name}`,
    fall: 'Fall of the floor from the high point',
    differs: (what, found, onSheet) => `${what}: ${found} as found, ${onSheet} on the sheet`,
    filler: (run, { end, by, isNarrower }) =>
      `${run}, filler ${end}: ${by} ${isNarrower ? 'narrower' : 'wider'} at the front than on the sheet`,
    kick: (run, { by, isHigher }) =>
      `${run}, kick: up to ${by} ${isHigher ? 'higher' : 'lower'} at the low point`,
  },
  es: {
    corner: (name) => `Esquina ${name}`,
    fall: 'Caída del piso desde el punto más alto',
    differs: (what, found, onSheet) => `${what}: ${found} aquí, ${onSheet} en la hoja`,
    filler: (run, { end, by, isNarrower }) =>
      `${run}, relleno ${end === 'left' ? 'izquierdo' : 'derecho'}: ${by} más ${isNarrower ? 'angosto' : 'ancho'} al frente que en la hoja`,
    kick: (run, { by, isHigher }) =>
      `${run}, {kick}: hasta ${by} más ${isHigher ? 'alto' : 'bajo'} en el punto más bajo`,
  },
};
