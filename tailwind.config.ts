import type { Config } from 'tailwindcss';

/**
 * The look as names. The values live in `app/globals.css`, where they change for the dark set, for
 * phone screens read in sun, and for paper; a class name never says which.
 */
const colour = (name: string) => `var(--${name})`;
const size = (name: string, lineHeight: string): [string, { lineHeight: string }] => [
  `var(--size-${name})`,
  { lineHeight },
];

export default {
  theme: {
    colors: {
      transparent: 'transparent',
      current: 'currentColor',
      inherit: 'inherit',
      /** The ground and what lies on it. */
      paper: colour('paper'),
      sheet: colour('sheet'),
      tint: colour('tint'),
      tape: colour('tape'),
      /** Lines and letters. */
      ink: colour('ink'),
      graphite: colour('graphite'),
      rule: colour('rule'),
      /** Letters on a filled pine, chalk or blueprint. */
      'on-fill': colour('on-fill'),
      /** Meaning; always with a glyph and a word. */
      pine: colour('pine'),
      chalk: colour('chalk'),
      ochre: colour('ochre'),
      moss: colour('moss'),
      blueprint: colour('blueprint'),
      /** Crews, in the order in which a shop adds them. */
      crew1: colour('crew1'),
      crew2: colour('crew2'),
      crew3: colour('crew3'),
      crew4: colour('crew4'),
      crew5: colour('crew5'),
      crew6: colour('crew6'),
    },
    fontFamily: { sans: ['Work Sans', 'system-ui', 'sans-serif'] },
    fontSize: {
      note: size('note', '1.4'),
      body: size('body', '1.45'),
      lead: size('lead', '1.3'),
      title: size('title', '1.15'),
      reading: size('reading', '1'),
    },
    fontWeight: { normal: '400', medium: '500', bold: '600' },
    borderRadius: { none: '0', DEFAULT: '3px' },
    /** Only a thing that is being dragged lifts off the paper. */
    boxShadow: { none: 'none', dragged: '0 6px 18px rgb(0 0 0 / 0.28)' },
    extend: {
      maxWidth: { phone: '30rem', form: '26rem', prose: '38rem', page: '68rem' },
      minHeight: { thumb: '3.5rem', key: '2.75rem' },
      minWidth: { thumb: '3.5rem', key: '2.75rem' },
    },
  },
} satisfies Config;
