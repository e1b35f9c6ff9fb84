/** Values for a preview and for counting, long enough to be honest. */
import type { Language } from '@/lib/time/text-locale';
import type { Field } from './occasions';

const common = {
  shop: 'Juniper Bend Cabinets',
  shopPhone: '(202) 555-0100',
  customer: 'Rosa Quillfeather',
  address: '1140 Upper Saltgrass Lane, Tarn Harbor',
  crew: 'Ines and Bram',
  link: 'https://setwell.example/v/7hK2mXqP9sRtV4wYbN6cDf',
  minutesLate: '45',
};

export const sampleValues: Record<Language, Record<Field, string>> = {
  en: {
    ...common,
    visit: 'countertop template',
    day: 'Wednesday, September 23',
    window: 'between 11:00 AM and 1:00 PM',
    oldDay: 'Wednesday, September 16',
    oldWindow: 'between 11:00 AM and 1:00 PM',
    reason: 'The floor is not down yet.',
  },
  es: {
    ...common,
    crew: 'Ines y Bram',
    visit: 'instalación de gabinetes',
    day: 'miércoles 23 de septiembre',
    window: 'entre las 11:00 a.m. y la 1:00 p.m.',
    oldDay: 'miércoles 16 de septiembre',
    oldWindow: 'entre las 11:00 a.m. y la 1:00 p.m.',
    reason: 'El piso aún no está puesto.',
  },
};
