/** How a text for a person is written: its language, and the region's way with dates and clocks. */

export const languages = ['en', 'es'] as const;
export type Language = (typeof languages)[number];

/** As in the shop's rules. */
export type Region = 'US' | 'UK' | 'AU' | 'EU';

export type TextLocale = { language: Language; region: Region };

/** Twelve-hour clock in the US and Australia, twenty-four in the UK and Europe (Unicode CLDR, preferred hours). */
export const clockOf: Record<Region, '12h' | '24h'> = {
  US: '12h',
  AU: '12h',
  UK: '24h',
  EU: '24h',
};

export const weekdayWords: Record<Language, readonly string[]> = {
  en: ['Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday', 'Sunday'],
  es: ['lunes', 'martes', 'miércoles', 'jueves', 'viernes', 'sábado', 'domingo'],
};

export const monthWords: Record<Language, readonly string[]> = {
  en: [
    'January',
    'February',
    'March',
    'April',
    'May',
    'June',
    'July',
    'August',
    'September',
    'October',
    'November',
    'December',
  ],
  es: [
    'enero',
    'febrero',
    'marzo',
    'abril',
    'mayo',
    'junio',
    'julio',
    'agosto',
    'septiembre',
    'octubre',
    'noviembre',
    'diciembre',
  ],
};
