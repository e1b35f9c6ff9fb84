import { addPhotoInput, listPhotosInput, MOST_PHOTO_BYTES } from '@/lib/contracts/files';
import { handle } from '@/server/base/handle';
import { handleUpload } from '@/server/base/handle-upload';
import { addPhoto } from '@/server/files/add-photo';
import { listPhotos } from '@/server/files/list-photos';

export const GET = handle(listPhotosInput, listPhotos);
export const POST = handleUpload({ input: addPhotoInput, mostBytes: MOST_PHOTO_BYTES }, addPhoto);
