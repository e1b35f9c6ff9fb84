/** Photos on the wire: the picture itself is the body, what is said of it stands in the address. */
import { z } from 'zod';

const id = z.uuid();

/** The most that one photo may weigh. */
export const MOST_PHOTO_BYTES = 8_000_000;

/** The phone makes the id; sent twice, a photo is kept once. */
export const addPhotoInput = z
  .object({
    fileId: id,
    roomId: id.optional(),
    /** Of a job of which no room is drawn. */
    jobId: id.optional(),
    wallId: id.optional(),
    takenAt: z.iso.datetime(),
    /** What is to be seen, with the figures written on it; read out where the picture cannot be seen. */
    caption: z
      .string()
      .trim()
      .max(300)
      .refine(
        (words) => !words.includes('\0') && words.isWellFormed(),
        'Type it again, in letters.',
      )
      .default(''),
  })
  .refine(({ roomId, jobId }) => (roomId === undefined) !== (jobId === undefined), {
    message: 'Name a room or a job.',
  });
export type AddPhotoInput = z.infer<typeof addPhotoInput>;
export type AddPhotoAnswer = { fileId: string };

export const fileIdInput = z.object({ fileId: id });

/** The photos of one room, or of every room of a job. */
export const listPhotosInput = z
  .object({ roomId: id.optional(), jobId: id.optional() })
  .refine(({ roomId, jobId }) => (roomId === undefined) !== (jobId === undefined), {
    message: 'Name a room or a job.',
  });
export type ListPhotosInput = z.infer<typeof listPhotosInput>;

export type PhotoRow = {
  id: string;
  roomId: string;
  wallId: string | null;
  caption: string;
  widthPx: number;
  heightPx: number;
  takenAt: string;
  takenBy: string;
};
