import { mkdtempSync, readdirSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { localFiles } from '@/server/ports/files/local-files';

describe('files on this machine', () => {
  const folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-files-'));
  const port = localFiles(folder);
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  const read = async (key: string) => {
    const stream = await port.read(key);
    return stream ? new Response(stream).text() : null;
  };

  it('are read as they were put, and whole when two put one at once', async () => {
    const long = (letter: string) => Buffer.from(letter.repeat(300_000));
    await Promise.all(['a', 'b'].map((letter) => port.put('shop-1/one.jpg', long(letter))));
    expect(await read('shop-1/one.jpg')).toMatch(/^(?:a{300000}|b{300000})$/);
    expect(readdirSync(path.join(folder, 'shop-1'))).toEqual(['one.jpg']);
  });

  it('are null where there are none', async () => {
    expect(await read('shop-1/two.jpg')).toBe(null);
  });

  it.each(['../out.jpg', 'a/../../out.jpg', '/etc/out.jpg', 'a//b.jpg', 'a.jpg/b', 'a\0.jpg', ''])(
    'lie under no key that leads out of their folder: %j',
    async (key) => {
      await expect(port.put(key, Buffer.from('x'))).rejects.toThrow('not a key');
      await expect(port.read(key)).rejects.toThrow('not a key');
    },
  );
});
