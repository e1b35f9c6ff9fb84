/** What is said where a photo is marked. Spanish is recalled. */
import type { CrewLanguage } from './crew';

export type PhotoWords = {
  gone: string;
  back: string;
  whichFigure: string;
  thenTouch: string;
  withOffice: string;
  savedHere: string;
  notTaken: (why: string) => string;
  howTo: Record<'circle' | 'arrow' | 'words', string>;
  tools: Record<'circle' | 'arrow' | 'words', string>;
  done: string;
  drawingIn: string;
  takeOff: string;
  throwAway: string;
};

export const photoWords: Record<CrewLanguage, PhotoWords> = {
  en: {
    gone: 'This photo is not on this phone any more.',
    back: 'Back',
    whichFigure: 'Which figure?',
    thenTouch: 'Then touch the photo where it goes.',
    withOffice: 'with the office',
    savedHere: 'saved here',
    notTaken: (why) => `The office did not take it: ${why}`,
    howTo: {
      circle: 'Touch what you mean, or draw from its middle outward.',
      arrow: 'Touch what you mean, or draw toward it.',
      words: 'Touch the photo where the figure goes.',
    },
    tools: { circle: 'Circle', arrow: 'Arrow', words: 'Figure' },
    done: 'Done',
    drawingIn: 'Drawing it in…',
    takeOff: 'Take the last mark off',
    throwAway: 'Throw it away',
  },
  es: {
    gone: 'Esta foto ya no está en este teléfono.',
    back: 'Atrás',
    whichFigure: '¿Qué medida?',
    thenTouch: 'Luego toque la foto donde va.',
    withOffice: 'en la oficina',
    savedHere: 'guardada aquí',
    notTaken: (why) => `La oficina no la aceptó: ${why}`,
    howTo: {
      circle: 'Toque lo que quiere mostrar, o dibuje desde su centro hacia afuera.',
      arrow: 'Toque lo que quiere mostrar, o dibuje hacia ello.',
      words: 'Toque la foto donde va la medida.',
    },
    tools: { circle: 'Círculo', arrow: 'Flecha', words: 'Medida' },
    done: 'Listo',
    drawingIn: 'Dibujando…',
    takeOff: 'Quitar la última marca',
    throwAway: 'Tirar la foto',
  },
};
