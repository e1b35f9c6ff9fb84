/**
 * What a crew goes through on site, by the kind of visit. A shop may write its own lines; these are what a
 * new shop starts with.
 * Sources: before delivery and install, P01–P08; parts checked before they are fixed, G07; setting, S02, S06,
 * S07; template-ready, P18; the last walk, G08; measure day, M21–M25 and P13 (common practice, trade sites).
 */
import type { ChecklistItem, ChecklistRules } from '@/lib/contracts/checklists';
import type { VisitKind } from '@/lib/schedule/visit-kind';

type Line = [key: string, en: string, es: string, isCaution?: 'caution'];

const lines = (when: ChecklistItem['when'], ...all: Line[]): ChecklistItem[] =>
  all.map(([key, en, es, caution]) => ({
    key,
    words: { en, es },
    when,
    ...(caution ? { isCaution: true } : {}),
  }));

const arriving = lines(
  'on-arrival',
  [
    'met',
    'Met who is in charge and said what is done today',
    'Hablamos con la persona a cargo y le dijimos qué se hace hoy',
  ],
  ['covered', 'Floor and way in covered', 'Piso y entrada protegidos'],
);

const services = lines(
  'on-arrival',
  [
    'services-safe',
    'Power, water and gas made safe by the licensed trade',
    'Luz, agua y gas asegurados por un técnico con licencia',
    'caution',
  ],
  [
    'old-paint',
    'Old house: the local law is followed before cutting, sanding or scraping',
    'Casa antigua: se sigue la ley local antes de cortar, lijar o raspar',
    'caution',
  ],
);

const setting = lines(
  'at-work',
  [
    'parts-checked',
    'Parts counted and looked over before any is fixed',
    'Piezas contadas y revisadas antes de fijar la primera',
  ],
  [
    'as-found',
    'High point and corners read again, and they hold',
    'Punto más alto y esquinas medidos de nuevo, y coinciden',
  ],
  [
    'cables',
    'Looked for cables and pipes before drilling',
    'Buscamos cables y tubos antes de taladrar',
    'caution',
  ],
  [
    'studs',
    'Wall units fixed top and bottom to studs or backing, never to board alone',
    'Gabinetes altos fijados arriba y abajo a los montantes o refuerzos, nunca solo al panel de yeso',
    'caution',
  ],
  [
    'tall',
    'Tall units secured before the doors went on',
    'Torres aseguradas antes de poner las puertas',
    'caution',
  ],
);

const leaving = lines(
  'before-leaving',
  [
    'doors',
    'Doors and drawers even, and they open and close',
    'Puertas y cajones parejos, abren y cierran bien',
  ],
  ['gaps', 'Gaps at walls closed, no damage to be seen', 'Huecos cerrados, sin daños a la vista'],
  ['clean', 'Swept, no screws left, rubbish taken', 'Barrido, sin tornillos, basura retirada'],
  ['walked', 'Walked through with the customer', 'Recorrido hecho con el cliente'],
);

const measuring = [
  ...arriving.slice(0, 1),
  ...lines(
    'at-work',
    [
      'appliances',
      'Models of appliances and sink are known',
      'Se conocen los modelos de los aparatos y del fregadero',
    ],
    ['floor', 'What floor is still to come is written down', 'Anotado qué piso falta por poner'],
    [
      'way-in',
      'Doorways, stairs and turns on the way in measured',
      'Puertas, escaleras y vueltas de la entrada medidas',
    ],
    ['laser', 'Nobody looked into the laser', 'Nadie miró directo al láser', 'caution'],
  ),
  ...lines('before-leaving', [
    'photos',
    'A photo of each wall with its services',
    'Una foto de cada pared con sus instalaciones',
  ]),
];

/** The lists of a new shop. */
export const usualChecklists: Record<VisitKind, ChecklistItem[]> = {
  'site-measure': measuring,
  'check-measure': measuring,
  delivery: [
    ...arriving,
    ...lines(
      'at-work',
      [
        'parts-counted',
        'Everything counted against the list, damage noted',
        'Todo contado contra la lista, daños anotados',
      ],
      ['dry', 'Stands dry, out of the sun and out of the way', 'En seco, sin sol y sin estorbar'],
      ['lift', 'What is heavy was lifted by two', 'Lo pesado se levantó entre dos', 'caution'],
    ),
  ],
  install: [...arriving, ...services, ...setting, ...leaving],
  'worktop-template': [
    ...arriving.slice(0, 1),
    ...lines(
      'on-arrival',
      [
        'fixed',
        'Boxes, fillers and end panels fixed and level',
        'Cajas, rellenos y costados fijos y a nivel',
      ],
      [
        'sink-here',
        'Sink, cooktop and taps are on site',
        'Fregadero, parrilla y llaves están en el sitio',
      ],
    ),
  ],
  return: [...arriving, ...services, ...leaving],
};

/**
 * The list of a visit: the shop's own where it has one, else the usual.
 * Edge: a shop that emptied a list has none. Example: no rules of its own gives the usual list.
 */
export function checklistOf(kind: VisitKind, own: ChecklistRules | undefined): ChecklistItem[] {
  return own?.[kind] ?? usualChecklists[kind];
}
