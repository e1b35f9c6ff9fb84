/** What the phone says of itself: what is safe on it, what the office has, who holds it. Spanish is recalled. */
import type { DayEvent } from '@/lib/contracts/day-events';
import type { ReportVisitInput } from '@/lib/contracts/visits';
import type { CrewLanguage } from './crew';

export type KeptThing = 'page' | 'day' | 'visit' | 'room';

export type PhoneWords = {
  ready: string;
  keptSoFar: string;
  asOf: (time: string) => string;
  waitHere: string;
  mayBeCleared: string;
  signOut: string;
  signingOut: string;
  notWithOffice: (count: number, personName: string) => string;
  notTaken: string;
  keptHere: (count: number) => string;
  nothingLost: string;
  tryAgain: string;
  trying: string;
  work: {
    room: (name: string) => string;
    submit: string;
    report: (what: ReportVisitInput['what']) => string;
    reading: string;
    photo: (place: string) => string;
    event: Record<DayEvent['what'], string>;
  };
  cannotKeep: string;
  noSignal: string;
  notHere: Record<KeptThing, string>;
  notOpenedHere: string;
  nobody: string;
  wantsSignal: string;
  keptForReader: (count: number) => string;
  halfDrawn: string;
};

const en: PhoneWords = {
  ready: 'Ready for no signal',
  keptSoFar: 'Kept here so far',
  asOf: (time) => `as of ${time}`,
  waitHere: 'Readings wait on this phone until they are sent.',
  mayBeCleared:
    'Readings wait on this phone until they are sent. This browser may clear them when space runs very short: put Setwell on the home screen, and it will not.',
  signOut: 'Sign out',
  signingOut: 'Signing out…',
  notWithOffice: (count, personName) =>
    count === 1
      ? `1 thing is not with the office yet. It stays on this phone, and goes out when ${personName} signs in on it again.`
      : `${count} things are not with the office yet. They stay on this phone, and go out when ${personName} signs in on it again.`,
  notTaken: 'Not taken by the office',
  keptHere: (count) => `${count} kept here`,
  nothingLost: 'Nothing is lost: it stays on this phone. Once the cause is gone, try again.',
  tryAgain: 'Try again',
  trying: 'Trying…',
  work: {
    room: (name) => `Drawing of ${name}`,
    submit: 'A wall book handed in',
    report: (what) => `Tap on a visit: ${what.replaceAll('-', ' ')}`,
    reading: 'A reading',
    photo: (place) => `Photo: ${place}`,
    event: {
      pause: 'A pause on site',
      'go-on': 'Work gone on with',
      check: 'A line of the checklist',
      snag: 'A snag',
      'close-snag': 'A snag closed',
      'as-found': 'Readings as found',
      'sign-off': 'The customer’s signature',
      'code-seen': 'The access code was looked at',
    },
  },
  cannotKeep: 'nothing can be kept here',
  noSignal: 'No signal',
  notHere: {
    page: 'This page is not on this phone',
    day: 'This day is not on this phone',
    visit: 'This visit is not on this phone',
    room: 'This room is not on this phone',
  },
  notOpenedHere:
    'There is no signal, and it was not opened here while there was one. What you measured is kept; try again where there is a signal.',
  nobody: 'Nobody is signed in on this phone',
  wantsSignal: 'Signing in wants a signal.',
  keptForReader: (count) =>
    `What was measured here is kept: ${count} to send when its reader signs in again.`,
  halfDrawn: 'the room half drawn',
};

const es: PhoneWords = {
  ready: 'Listo sin señal',
  keptSoFar: 'Guardado hasta ahora',
  asOf: (time) => `a las ${time}`,
  waitHere: 'Lo anotado espera en este teléfono hasta que se envía.',
  mayBeCleared:
    'Lo anotado espera en este teléfono hasta que se envía. Este navegador puede borrarlo si falta mucho espacio: ponga Setwell en la pantalla de inicio y no lo hará.',
  signOut: 'Salir',
  signingOut: 'Saliendo…',
  notWithOffice: (count, personName) =>
    count === 1
      ? `1 cosa aún no está en la oficina. Se queda en este teléfono y sale cuando ${personName} vuelva a entrar.`
      : `${count} cosas aún no están en la oficina. Se quedan en este teléfono y salen cuando ${personName} vuelva a entrar.`,
  notTaken: 'La oficina no lo aceptó',
  keptHere: (count) => `${count} aquí`,
  nothingLost:
    'Nada se perdió: sigue en este teléfono. Cuando se resuelva la causa, intente de nuevo.',
  tryAgain: 'Intentar de nuevo',
  trying: 'Intentando…',
  work: {
    room: (name) => `Dibujo de ${name}`,
    submit: 'Un libro de medidas entregado',
    report: (what) => `Aviso de la visita: ${reportsEs[what]}`,
    reading: 'Una medida',
    photo: (place) => `Foto: ${place}`,
    event: {
      pause: 'Una pausa',
      'go-on': 'Se siguió el trabajo',
      check: 'Una línea de la lista de revisión',
      snag: 'Un pendiente',
      'close-snag': 'Un pendiente cerrado',
      'as-found': 'Medidas antes de colocar',
      'sign-off': 'La firma del cliente',
      'code-seen': 'Se vio el código de acceso',
    },
  },
  cannotKeep: 'aquí no se puede guardar nada',
  noSignal: 'Sin señal',
  notHere: {
    page: 'Esta página no está en este teléfono',
    day: 'Este día no está en este teléfono',
    visit: 'Esta visita no está en este teléfono',
    room: 'Este cuarto no está en este teléfono',
  },
  notOpenedHere:
    'No hay señal, y no se abrió aquí cuando la había. Lo que midió está guardado; intente de nuevo donde haya señal.',
  nobody: 'Nadie ha entrado en este teléfono',
  wantsSignal: 'Para entrar hace falta señal.',
  keptForReader: (count) =>
    `Lo que se midió aquí está guardado: ${count} por enviar cuando su dueño vuelva a entrar.`,
  halfDrawn: 'el cuarto a medio dibujar',
};

const reportsEs: Record<ReportVisitInput['what'], string> = {
  'on-the-way': 'en camino',
  'running-late': 'tarde',
  arrived: 'llegada',
  done: 'terminada',
  'nobody-home': 'no había nadie',
};

export const phoneWords: Record<CrewLanguage, PhoneWords> = { en, es };
