import { describe, expect, it } from 'vitest';
import type { Drawing, Shape } from '@/lib/drawing/shape';
import { crewWords, inRegion } from '@/lib/words/crew';
import { drawingIn } from '@/lib/words/drawn-words';
import { phoneWords } from '@/lib/words/phone-words';
import { photoWords } from '@/lib/words/photo-words';
import { unitIn } from '@/lib/words/unit-names';

const inSpanish = { language: 'es', region: 'US' } as const;

/** Every text of a table, with its functions called on what they are given. */
function textsIn(words: unknown): string[] {
  if (typeof words === 'string') return [words];
  // Most are given counts or names; the edge of a run is an object of the engine.
  if (typeof words === 'function') {
    return [words(words.name === 'edge' ? { edge: 'kick', words: 'front' } : 2, 3, 4)];
  }
  return Object.values(words ?? {}).flatMap(textsIn);
}

const english =
  /(?<!\p{L})(the|and|your|you|not|with|office|crew|bench|wall|corner|floor|drywall|countertop|toe kick|snag|photo|sheet|done|back)(?!\p{L})/iu;

describe('what a crew reads in Spanish', () => {
  it('carries no English, on any screen of the day', () => {
    const texts = [crewWords.es, phoneWords.es, photoWords.es]
      .flatMap(textsIn)
      .map((text) => inRegion(text, inSpanish));
    expect(texts.length).toBeGreaterThan(200);
    expect(texts.filter((text) => english.test(text))).toEqual([]);
    // No name of the trade is left in braces.
    expect(texts.filter((text) => /[{}]/.test(text))).toEqual([]);
  });

  it('calls a box without a name by what it is', () => {
    expect(unitIn({ name: '', kind: 'refrigerator' }, inSpanish)).toBe('Refrigerador');
    expect(unitIn({ name: '', kind: 'sink' }, { language: 'en', region: 'US' })).toBe('Sink');
    expect(unitIn({ name: 'Sink 36', kind: 'sink' }, inSpanish)).toBe('Sink 36');
  });

  it('is drawn with Spanish words, its figures and names as they were', () => {
    const text = (words: string): Shape => ({
      kind: 'text',
      at: [0, 0],
      spans: [{ words, tone: 'plain' }],
      anchor: 'start',
      turnDeg: 0,
      sizePx: 12,
    });
    const drawing: Drawing = {
      shapes: ['wall A, not read', 'blank 2 1/16', 'high point', 'stud (predicted)', 'W3 sink'].map(
        text,
      ),
      bounds: { left: 0, top: 0, width: 1, height: 1 },
      exaggeration: 1,
      pxPerMm: 1,
    };
    const said = drawingIn(drawing, inSpanish).shapes.map((shape) =>
      shape.kind === 'text' ? shape.spans[0]?.words : '',
    );
    expect(said).toEqual([
      'pared A, sin medir',
      'pieza 2 1/16',
      'punto más alto',
      'montante (calculado)',
      'W3 fregadero',
    ]);
    expect(drawingIn(drawing, { language: 'en', region: 'US' })).toBe(drawing);
  });
});
