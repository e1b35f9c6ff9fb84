import { and, eq } from 'drizzle-orm';
import { jobs, rooms } from '@/db/schema';
import type { AddPhotoAnswer, AddPhotoInput } from '@/lib/contracts/files';
import { cleanJpeg } from '@/lib/files/clean-jpeg';
import { pictureKind } from '@/lib/files/picture-kind';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { countTry } from '@/server/base/limits';
import { notFound, Refusal } from '@/server/base/problem-response';
import { keepFile } from './keep-file';

/** A long day with both hands full of photos stays far below. */
const limit = { most: 300, windowSeconds: 3_600 };

/** Keeps a photo of a room or a job, stripped of everything but the picture. Sent twice it is kept once. */
export async function addPhoto(
  ctx: PersonContext,
  input: AddPhotoInput & { bytes: Uint8Array },
): Promise<AddPhotoAnswer> {
  mustBeAllowed(ctx, 'walls:measure');
  const { fileId, wallId = null } = input;
  await countTry(ctx.db, `photo:${ctx.actor.personId}`, limit, ctx.now);
  const { jobId, roomId, placeWords } = await findPlace(ctx, input);
  const { bytes, widthPx, heightPx } = cleaned(input.bytes);
  return keepFile(
    ctx,
    bytes,
    {
      id: fileId,
      jobId,
      roomId,
      wallId,
      name: `photo-${fileId.slice(0, 8)}.jpg`,
      caption: input.caption,
      mediaType: 'image/jpeg',
      ending: 'jpg',
      widthPx,
      heightPx,
      takenAt: new Date(input.takenAt),
    },
    {
      verb: 'add-photo',
      subjectKind: roomId ? 'room' : 'job',
      subjectId: roomId ?? jobId,
      summary: `Took a photo${placeWords}`,
    },
  );
}

type Place = { jobId: string; roomId: string | null; placeWords: string };

async function findPlace(ctx: PersonContext, { roomId, jobId }: AddPhotoInput): Promise<Place> {
  if (roomId === undefined) return findJob(ctx, jobId ?? '');
  const [room] = await ctx.db
    .select({ jobId: rooms.jobId, name: rooms.name })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, roomId)));
  if (!room) throw notFound('room');
  return { jobId: room.jobId, roomId, placeWords: ` in ${room.name}` };
}

async function findJob(ctx: PersonContext, jobId: string): Promise<Place> {
  const [job] = await ctx.db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
  return { jobId, roomId: null, placeWords: '' };
}

function cleaned(bytes: Uint8Array) {
  const kind = pictureKind(bytes);
  if (kind !== 'jpeg') throw notJpeg(bytes.length === 0 ? 'nothing at all' : kindWords[kind]);
  const { value, problems } = cleanJpeg(bytes);
  if (value) return value;
  const [first] = problems;
  throw new Refusal({
    status: 422,
    code: first?.code ?? 'photo-broken',
    message: `${first?.message ?? 'This photo is damaged.'} Nothing was kept.`,
  });
}

const kindWords: Record<Exclude<ReturnType<typeof pictureKind>, 'jpeg'>, string> = {
  png: 'a PNG picture',
  gif: 'a GIF picture',
  webp: 'a WebP picture',
  heic: 'a HEIC picture',
  svg: 'an SVG drawing, which can carry programs',
  pdf: 'a PDF',
  zip: 'a packed archive',
  unknown: 'no picture',
};

function notJpeg(words: string): Refusal {
  return new Refusal({
    status: 415,
    code: 'not-a-photo',
    message: `Photos are kept as JPEG, and this is ${words}. Nothing was kept.`,
  });
}
