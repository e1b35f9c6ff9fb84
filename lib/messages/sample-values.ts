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
    arrival: 'about 11:45 AM',
    reason: 'The floor is not down yet.',
    missing: 'the floor; the power',
    moves: [
      'Cabinet install: Wed, Sep 16, 11:00 AM-1:00 PM',
      'https://setwell.example/v/7hK2mXqP9sRtV4wYbN6cDf',
      'Countertop template: Wed, Sep 23, 11:00 AM-1:00 PM',
      'https://setwell.example/v/Qw3rTy8uIoPa5sDfGhJkLz',
    ].join('\n'),
    choices:
      '1 for the site measure on Wed, Sep 16, or 2 for the countertop template on Wed, Sep 23',
  },
  es: {
    ...common,
    crew: 'Ines y Bram',
    visit: 'instalación de gabinetes',
    day: 'miércoles 23 de septiembre',
    window: 'entre las 11:00 a.m. y la 1:00 p.m.',
    oldDay: 'miércoles 16 de septiembre',
    oldWindow: 'entre las 11:00 a.m. y la 1:00 p.m.',
    arrival: 'cerca de las 11:45 a.m.',
    reason: 'El piso aún no está puesto.',
    missing: 'el piso; la electricidad',
    moves: [
      'Instalación de gabinetes: mié 16 sep, 11:00 a.m.-1:00 p.m.',
      'https://setwell.example/v/7hK2mXqP9sRtV4wYbN6cDf',
      'Plantilla de la cubierta: mié 23 sep, 11:00 a.m.-1:00 p.m.',
      'https://setwell.example/v/Qw3rTy8uIoPa5sDfGhJkLz',
    ].join('\n'),
    choices:
      '1 para la toma de medidas del mié 16 sep, o 2 para la plantilla de la cubierta del mié 23 sep',
  },
};
