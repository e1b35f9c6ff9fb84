import type { CustomerVisitView } from '@/lib/contracts/visits';
import type { VisitKind } from '@/lib/schedule/visit-kind';

type Words = {
  arrive: (window: string, until: string) => string;
  comes: (names: string, what: string, where: string) => string;
  what: Record<VisitKind, string>;
  yes: string;
  another: string;
  anotherHint: string;
  notReady: string;
  notReadyHint: string;
  send: string;
  calendar: string;
  before: string;
  clear: Record<'measure' | 'work', string[]>;
  oldHouse: string;
  caution: string;
  thanks: string;
  said: (words: string) => string;
  done: string;
  calledOff: string;
  missed: string;
  ring: string;
};

const en: Words = {
  arrive: (window, until) => `We arrive ${window}${until ? ` and work ${until}` : ''}.`,
  comes: (names, what, where) => `${names} ${what} at ${where}.`,
  what: {
    'site-measure': 'will measure your room',
    'check-measure': 'will check a measurement',
    delivery: 'will deliver your cabinets',
    install: 'will set your cabinets',
    'worktop-template': 'will take the template for your countertop',
    return: 'will come back for the last pieces',
  },
  yes: 'Yes, that works',
  another: 'Ask for another time',
  anotherHint: 'Which days and times suit you?',
  notReady: 'We are not ready yet',
  notReadyHint: 'What is not ready: floor, power, parking, away?',
  send: 'Tell the shop',
  calendar: 'Add to calendar',
  before: 'Before we come',
  clear: {
    measure: [
      'Clear the countertops and what stands along the walls',
      'Somebody at home who can open the door',
      'Have the sheets of your appliances and sink at hand, if they are chosen',
    ],
    work: [
      'Clear the countertops and the way in from the street',
      'Water, gas and power to the kitchen off and disconnected by the licensed trade',
      'Children and pets out of the room: saws and lifting',
      'Room for the van near the door',
    ],
  },
  oldHouse:
    'Your home may be old enough for lead paint or asbestos. Tell us what you know: the local law comes before anything is cut, sanded or scraped.',
  caution: 'Stay clear of tools and lifted cabinets while we work.',
  thanks: 'Thank you. You are expected, and so are we.',
  said: (words) => `We have your words: “${words}”. The shop will get back to you.`,
  done: 'This visit is done. Thank you.',
  calledOff: 'This visit has been called off. The shop will get back to you.',
  missed: 'We were there and found nobody home. The shop will get back to you.',
  ring: 'Reach the shop',
};

const es: Words = {
  arrive: (window, until) => `Llegamos ${window}${until ? ` y trabajamos ${until}` : ''}.`,
  comes: (names, what, where) => `${names} ${what} en ${where}.`,
  what: {
    'site-measure': 'tomará las medidas de su cuarto',
    'check-measure': 'revisará una medida',
    delivery: 'entregará sus gabinetes',
    install: 'instalará sus gabinetes',
    'worktop-template': 'tomará la plantilla de su cubierta',
    return: 'regresará para las últimas piezas',
  },
  yes: 'Sí, está bien',
  another: 'Pedir otra hora',
  anotherHint: '¿Qué días y horas le convienen?',
  notReady: 'Todavía no estamos listos',
  notReadyHint: '¿Qué falta: piso, electricidad, estacionamiento, no estarán?',
  send: 'Avisar al taller',
  calendar: 'Agregar al calendario',
  before: 'Antes de que lleguemos',
  clear: {
    measure: [
      'Despeje las cubiertas y lo que esté junto a las paredes',
      'Alguien en casa que pueda abrir la puerta',
      'Tenga a mano las hojas de sus electrodomésticos y del fregadero, si ya los eligió',
    ],
    work: [
      'Despeje las cubiertas y el paso desde la calle',
      'Agua, gas y electricidad de la cocina cortados y desconectados por un profesional con licencia',
      'Niños y mascotas fuera del cuarto: hay sierras y carga pesada',
      'Lugar para la camioneta cerca de la puerta',
    ],
  },
  oldHouse:
    'Su casa puede tener pintura con plomo o asbesto. Díganos lo que sepa: la ley local va antes de cortar, lijar o raspar.',
  caution: 'Manténgase lejos de las herramientas y de los gabinetes en alto mientras trabajamos.',
  thanks: 'Gracias. Le esperamos y nos espera.',
  said: (words) => `Recibimos sus palabras: «${words}». El taller se comunicará con usted.`,
  done: 'Esta visita ha terminado. Gracias.',
  calledOff: 'Esta visita se canceló. El taller se comunicará con usted.',
  missed: 'Fuimos y no había nadie en casa. El taller se comunicará con usted.',
  ring: 'Llame al taller',
};

export const customerWords = (language: CustomerVisitView['language']): Words =>
  language === 'es' ? es : en;
