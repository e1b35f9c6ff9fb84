/** The customer's signature on the wire, and the record that is made of it. */
import { z } from 'zod';
import { MOST_POINTS, MOST_STROKES, PEN_FIELD } from '@/lib/signing/pen-field';
import { plainWords, snagKinds, snagMenders } from './snags';

const id = z.uuid();

/** A point of the pen, from the upper left of the field. */
const penPoint = z.tuple([
  z.number().finite().min(0).max(PEN_FIELD.width),
  z.number().finite().min(0).max(PEN_FIELD.height),
]);
/** Strokes in the order in which they were drawn; drawn again wherever the record is shown. */
export const penStrokes = z
  .array(
    z
      .array(penPoint)
      .min(1)
      .max(MOST_POINTS / 6),
  )
  .min(1, 'Sign in the field.')
  .max(MOST_STROKES)
  .refine((strokes) => strokes.reduce((sum, stroke) => sum + stroke.length, 0) <= MOST_POINTS, {
    message: 'That is more than a signature. Clear the field and sign again.',
  });
export type PenStrokes = z.infer<typeof penStrokes>;

/** A snag as it stood when the customer signed. */
export const signedSnag = z.object({
  id,
  kind: z.enum(snagKinds),
  /** Room and unit, in words. */
  place: plainWords(160),
  words: plainWords(600),
  mender: z.enum(snagMenders),
  dueOn: z.iso.date().nullable(),
});
export type SignedSnag = z.infer<typeof signedSnag>;

export const signOffFields = {
  name: plainWords(120).min(1, 'Write the name of who signs.'),
  language: z.enum(['en', 'es']),
  /** What stood over the field, word for word. */
  statement: plainWords(1_000).min(1),
  strokes: penStrokes,
  /** The open snags that were shown. */
  snags: z.array(signedSnag).max(200),
};

export type SignOffView = {
  id: string;
  visitId: string;
  name: string;
  language: 'en' | 'es';
  statement: string;
  strokes: PenStrokes;
  snags: SignedSnag[];
  signedAt: string;
  signedWords: string;
  takenBy: string;
  /** The record is what it was when it was made: its seal was worked out again. */
  isUntouched: boolean;
};
