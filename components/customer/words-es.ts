import type { CustomerWords } from './customer-words';

const measure = [
  'Despeje las {counter}s y lo que esté junto a las paredes',
  'Que haya alguien en casa que pueda abrir la puerta',
  'Tenga a mano las fichas técnicas de sus electrodomésticos y del fregadero, si ya los eligió',
];
const work = [
  'Despeje las {counter}s y el paso desde la calle',
  'El agua, el gas y la electricidad de la cocina, cortados y desconectados por un profesional con licencia',
  'Niños y mascotas fuera del cuarto: usamos sierras y cargamos peso',
  'Lugar para la camioneta cerca de la puerta',
];

/** Recalled, not read in sources: to be checked by a native speaker. */
export const wordsEs: CustomerWords = {
  title: 'Su visita',
  arrive: (window, until) => sentence(`Llegamos ${window}${until ? ` y trabajamos ${until}` : ''}`),
  comes: (names, what) => `${whoComes(names)} a ${what} en`,
  what: {
    'site-measure': 'tomar las medidas de su cuarto',
    'check-measure': 'revisar una medida',
    delivery: 'entregar sus gabinetes',
    install: 'instalar sus gabinetes',
    'worktop-template': 'tomar la plantilla de su {counter}',
    return: 'terminar lo que falta',
  },
  ask: '¿Le conviene esta fecha?',
  yes: 'Sí, está bien',
  another: 'Pedir otra fecha',
  notReady: 'Todavía no estamos listos',
  notReadyMore: 'Falta algo más',
  notReadyLegend: '¿Qué falta?',
  missing: {
    floor: 'El piso',
    power: 'La electricidad',
    parking: 'Lugar para estacionar',
    away: 'Ese día no estaremos en casa',
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
      'Despeje los gabinetes bajos y no ponga nada sobre ellos',
      'Tenga a mano el fregadero, la {tap} y la {cooktop}, o sus fichas técnicas',
      'Que haya alguien en casa que pueda decidir sobre bordes y recortes',
    ],
    return: work,
  },
  oldHouse:
    'Por sus años, su casa puede tener pintura con plomo o asbesto. Díganos lo que sepa: antes de cortar, lijar o raspar hay que cumplir la ley local.',
  caution:
    'Manténgase lejos de las herramientas y de los gabinetes levantados mientras trabajamos.',
  thanks: 'Gracias, su visita queda confirmada. Hasta entonces.',
  said: (words) => `Usted nos dijo: «${words}». El taller se comunicará con usted.`,
  onTheWay: 'Vamos en camino.',
  late: (arrival) => sentence(`Disculpe, vamos con retraso. Ahora llegamos ${arrival}`),
  here: 'Ya estamos aquí.',
  done: 'Esta visita ha terminado. Gracias.',
  copy: 'Su copia de lo firmado',
  calledOff: 'Esta visita se canceló. El taller se comunicará con usted.',
  missed: 'Fuimos y no había nadie en casa. El taller se comunicará con usted.',
  ring: 'Llame al taller',
  map: 'en el mapa',
  timesTitle: 'Otra fecha',
  now: (day, window) => sentence(`Su visita está para el ${day}, ${window}`),
  choose: 'Elija una y se la guardamos durante 15 minutos.',
  noTimes: 'Por ahora no hay otra fecha para elegir aquí. Díganos qué le convendría y le llamamos.',
  taken: 'Esa fecha ya no está libre, o pasaron los 15 minutos. Estas son las que hay ahora.',
  kept: 'Guardada para usted',
  keptUntil: (time) => `hasta las ${time}`.replace(/las (0?1:)/, 'la $1'),
  left: (clock) => `quedan ${clock}`,
  keptOver: 'Ya no está guardada. Elija de nuevo.',
  take: 'Elegir esta fecha',
  others: 'O elija otra',
  noneSuits: 'Ninguna me conviene: llámenme',
  askCall: 'Pedir que le llamemos',
  callHint: '¿Cuándo le llamamos y qué fecha le convendría?',
  callMe: 'Llámenme',
  keep: 'Dejar la fecha como está',
  tooLate: 'Esta visita ya no se puede cambiar aquí. Llame al taller.',
};

/** "Ines y Bram vendrán", "Ines vendrá"; without names, who comes is the shop. */
function whoComes(names: readonly string[]): string {
  if (names.length === 0) return 'Vendremos';
  return `${new Intl.ListFormat('es').format(names)} ${names.length > 1 ? 'vendrán' : 'vendrá'}`;
}

/** One full stop at the end, though "a.m." brings its own. */
function sentence(words: string): string {
  return words.endsWith('.') ? words : `${words}.`;
}
