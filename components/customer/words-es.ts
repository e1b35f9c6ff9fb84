import type { CustomerWords } from './customer-words';

const measure = [
  'Despeje las {counter}s y lo que esté junto a las paredes',
  'Alguien en casa que pueda abrir la puerta',
  'Tenga a mano las hojas de sus electrodomésticos y del fregadero, si ya los eligió',
];
const work = [
  'Despeje las {counter}s y el paso desde la calle',
  'Agua, gas y electricidad de la cocina cortados y desconectados por un profesional con licencia',
  'Niños y mascotas fuera del cuarto: hay sierras y carga pesada',
  'Lugar para la camioneta cerca de la puerta',
];

/** Recalled, not read in sources: to be checked by a native speaker. */
export const wordsEs: CustomerWords = {
  arrive: (window, until) => sentence(`Llegamos ${window}${until ? ` y trabajamos ${until}` : ''}`),
  comes: (names, what) => `${names} ${what} en`,
  shopComes: 'El taller',
  what: {
    'site-measure': 'tomará las medidas de su cuarto',
    'check-measure': 'revisará una medida',
    delivery: 'entregará sus gabinetes',
    install: 'instalará sus gabinetes',
    'worktop-template': 'tomará la plantilla de su {counter}',
    return: 'regresará para las últimas piezas',
  },
  yes: 'Sí, está bien',
  another: 'Pedir otra hora',
  notReady: 'Todavía no estamos listos',
  notReadyLegend: '¿Qué falta?',
  missing: {
    floor: 'El piso',
    power: 'La electricidad',
    parking: 'Lugar para estacionar',
    away: 'Ese día no estaremos',
  },
  more: 'Algo más',
  send: 'Avisar al taller',
  readyNow: 'Ya está listo',
  calendar: 'Agregar al calendario',
  before: 'Antes de que lleguemos',
  clear: {
    'site-measure': measure,
    'check-measure': measure,
    delivery: [
      'Despeje el paso desde la calle y un cuarto seco donde puedan quedar los gabinetes',
      'Lugar para la camioneta cerca de la puerta',
      'Niños y mascotas fuera del paso: se cargan piezas pesadas',
    ],
    install: work,
    'worktop-template': [
      'Despeje los gabinetes de base y no ponga nada sobre ellos',
      'Tenga a mano el fregadero, la llave y la estufa, o sus hojas',
      'Alguien en casa que pueda decidir sobre bordes y huecos',
    ],
    return: work,
  },
  oldHouse:
    'Su casa puede tener pintura con plomo o asbesto. Díganos lo que sepa: la ley local va antes de cortar, lijar o raspar.',
  caution: 'Manténgase lejos de las herramientas y de los gabinetes en alto mientras trabajamos.',
  thanks: 'Gracias. Le esperamos y nos espera.',
  said: (words) => `Recibimos sus palabras: «${words}». El taller se comunicará con usted.`,
  onTheWay: 'Vamos en camino.',
  late: (arrival) => sentence(`Disculpe, vamos con retraso. Ahora llegamos ${arrival}`),
  here: 'Ya estamos aquí.',
  done: 'Esta visita ha terminado. Gracias.',
  copy: 'Su copia de lo que se firmó',
  calledOff: 'Esta visita se canceló. El taller se comunicará con usted.',
  missed: 'Fuimos y no había nadie en casa. El taller se comunicará con usted.',
  ring: 'Llame al taller',
  map: 'en el mapa',
  timesTitle: 'Otra hora',
  now: (day, window) => sentence(`Ahora es el ${day}, ${window}`),
  choose: 'Elija una y se la guardamos 15 minutos.',
  noTimes: 'Por ahora no encontramos otra hora.',
  taken: 'Esa hora ya no está libre, o se guardó demasiado tiempo. Esto es lo que hay ahora.',
  kept: 'Guardada para usted',
  keptUntil: (time) => `hasta las ${time}`.replace(/las (0?1:)/, 'la $1'),
  left: (clock) => `quedan ${clock}`,
  keptOver: 'Ya no está guardada. Elija de nuevo.',
  take: 'Tomar esta hora',
  others: 'O bien otra',
  noneSuits: 'Ninguna me sirve: llámenme',
  callHint: '¿Cuándo quiere que le llamemos y qué le convendría?',
  callMe: 'Llámenme',
  keep: 'Dejar la hora como está',
  tooLate: 'Esta visita ya no se puede mover aquí. Llame al taller.',
};

/** One full stop at the end, though "a.m." brings its own. */
function sentence(words: string): string {
  return words.endsWith('.') ? words : `${words}.`;
}
