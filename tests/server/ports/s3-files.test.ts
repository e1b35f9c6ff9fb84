import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type FakeS3, startFakeS3 } from '@/server/ports/files/fake-s3';
import type { FilesPort } from '@/server/ports/files/files-port';
import { s3Files } from '@/server/ports/files/s3-files';

describe('files in a bucket', () => {
  let fake: FakeS3;
  let files: FilesPort;
  beforeAll(async () => {
    fake = await startFakeS3();
    files = s3Files({
      bucket: 'shop',
      region: 'us-east-1',
      endpoint: fake.baseUrl,
      credentials: { accessKeyId: 'test', secretAccessKey: 'test' },
    });
  });
  afterAll(() => fake.stop());
  const read = async (key: string) => {
    const stream = await files.read(key);
    return stream && new Uint8Array(await new Response(stream).arrayBuffer());
  };

  it('come back byte for byte, under a key that names shop and file', async () => {
    const bytes = Uint8Array.from({ length: 70_000 }, (_, at) => (at * 7) % 256);
    await files.put('shop-1/photo.jpg', bytes);
    expect(fake.keys()).toEqual(['/shop/shop-1/photo.jpg']);
    expect(await read('shop-1/photo.jpg')).toEqual(bytes);
  });

  it('are null where there are none, and gone once removed, also twice', async () => {
    expect(await read('shop-1/none.jpg')).toBeNull();
    await files.put('shop-1/gone.jpg', new Uint8Array([1]));
    await files.remove('shop-1/gone.jpg');
    await files.remove('shop-1/gone.jpg');
    expect(await read('shop-1/gone.jpg')).toBeNull();
  });

  it('are kept although the store was busy at first', async () => {
    fake.refuseNext(1);
    await files.put('shop-1/busy.jpg', new Uint8Array([1, 2]));
    expect(await read('shop-1/busy.jpg')).toEqual(new Uint8Array([1, 2]));
  });
});
