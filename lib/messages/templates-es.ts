/**
 * What a new shop says in Spanish. The texts keep to letters that SMS carries cheaply (é, ñ and ¿ are among
 * them, á and ó are not). Recalled, not read in sources: to be checked by a native speaker.
 */
import type { OccasionTemplates } from './template';

export const templatesEs: OccasionTemplates = {
  booked: {
    sms: '{shop}: su {visit} queda para el {day}. Llegamos {window}. Detalles y cambios: {link}',
    subject: 'Su {visit} con {shop}: {day}',
    email: `Hola, {customer}:

Su {visit} en {address} queda para el {day}. Llegamos {window}.

Quién va: {crew}.

Vea qué conviene despejar, agregue la cita a su calendario o pida otra fecha:
{link}

{shop}
{shopPhone}`,
  },
  'please-confirm': {
    sms: '{shop}: ¿podemos ir el {day}, {window}, para su {visit}? Responda SI, o CAMBIO para pedir otra fecha. {link}',
    subject: 'Confirme, por favor: {visit} el {day}',
    email: `Hola, {customer}:

Pensamos ir el {day}, {window}, para su {visit} en {address}.

Díganos con un toque si le conviene, o pida otra fecha:
{link}

{shop}
{shopPhone}`,
  },
  'asked-again': {
    sms: '{shop}: no hemos recibido su respuesta. ¿Podemos ir el {day}, {window}, para su {visit}? Responda SI, o CAMBIO para pedir otra fecha. {link}',
    subject: '¿Le conviene? {visit} el {day}',
    email: `Hola, {customer}:

Todavía no hemos recibido su respuesta. Pensamos ir el {day}, {window}, para su {visit} en {address}.

Díganos con un toque si le conviene, o pida otra fecha:
{link}

{shop}
{shopPhone}`,
  },
  'day-before': {
    sms: '{shop}: le recordamos que vamos el {day}, {window}, para su {visit}. Qué despejar: {link}',
    subject: 'Recordatorio: {visit} el {day}',
    email: `Hola, {customer}:

Le recordamos que vamos el {day}, {window}, para su {visit} en {address}.

Qué conviene despejar y cómo comunicarse con nosotros:
{link}

{shop}
{shopPhone}`,
  },
  'on-my-way': {
    sms: '{shop}: vamos en camino y llegamos {window}. Preguntas: {shopPhone}',
    subject: 'En camino: {visit} hoy',
    email: `Hola, {customer}:

Vamos en camino para su {visit} en {address} y llegamos {window}.

Quién va: {crew}.

{link}

{shop}
{shopPhone}`,
  },
  'running-late': {
    sms: '{shop}: disculpe, llevamos unos {minutesLate} minutos de retraso y ahora llegamos {arrival}. Preguntas: {shopPhone}',
    subject: 'Vamos con retraso',
    email: `Hola, {customer}:

Disculpe: llevamos unos {minutesLate} minutos de retraso para su {visit} y ahora llegamos {arrival}.

{link}

{shop}
{shopPhone}`,
  },
  moved: {
    sms: '{shop}: su {visit} pasa del {oldDay} al {day}, {window}. Si no le conviene: {link}',
    subject: 'Nueva fecha: su {visit} es el {day}',
    email: `Hola, {customer}:

Su {visit} en {address} pasa del {oldDay}, {oldWindow}, al {day}. Llegamos {window}.

Si no le conviene, pida otra fecha:
{link}

{shop}
{shopPhone}`,
  },
  'moved-together': {
    sms: '{shop}: nuevas fechas para sus visitas. {moves} Preguntas: {shopPhone}',
    subject: 'Nuevas fechas para sus visitas',
    email: `Hola, {customer}:

Sus visitas tienen nuevas fechas:

{moves}

Si alguna no le conviene, pida otra fecha en su página o llámenos: {shopPhone}.

{shop}`,
  },
  'called-off': {
    sms: '{shop}: su {visit} del {day} queda cancelada. Le llamaremos para acordar otra fecha. Preguntas: {shopPhone}',
    subject: 'Cancelada: {visit} del {day}',
    email: `Hola, {customer}:

Su {visit} del {day} en {address} queda cancelada. {reason}

Le llamaremos para acordar otra fecha. Nuestro teléfono es {shopPhone}.

{shop}`,
  },
  missed: {
    sms: '{shop}: fuimos para su {visit} y no encontramos a nadie en casa. Llame al {shopPhone} y buscamos otra fecha.',
    subject: 'No le encontramos: {visit} del {day}',
    email: `Hola, {customer}:

Fuimos a {address} el {day} para su {visit} y no había nadie en casa.

Llámenos y buscamos otra fecha: {shopPhone}.

{shop}`,
  },
  'not-ready': {
    sms: '{shop}: anotado, falta: {missing}. Le llamamos antes del {day}. Preguntas: {shopPhone}',
    subject: 'Anotado: falta algo para su {visit}',
    email: `Hola, {customer}:

Anotamos lo que falta todavía para su {visit} en {address}: {missing}.

Le llamamos antes del {day}. Cuando esté listo, avísenos aquí o por teléfono:
{link}

{shop}
{shopPhone}`,
  },
  done: {
    sms: '{shop}: su {visit} ha terminado. Gracias. Detalles: {link}',
    subject: 'Ha terminado su {visit}',
    email: `Hola, {customer}:

Su {visit} en {address} ha terminado. Gracias.

Vea cómo quedó y lo que aún esté pendiente:
{link}

{shop}
{shopPhone}`,
  },
  'other-time': {
    sms: '{shop}: elija otra fecha para su {visit}: {link} O llame al {shopPhone}.',
    subject: '',
    email: '',
  },
  'which-visit': {
    sms: '{shop}: ¿a qué visita se refiere? Responda {choices}. O llame al {shopPhone}.',
    subject: '',
    email: '',
  },
  help: {
    sms: '{shop}: le escribimos solo sobre sus visitas. Llame al {shopPhone}.',
    subject: '',
    email: '',
  },
};
