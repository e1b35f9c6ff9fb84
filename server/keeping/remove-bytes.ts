import { logBug } from '@/server/base/log';
import { filesPort } from '@/server/ports/files/choose-files';

/** After the rows: bytes without a row are found by nobody, a row without bytes would be a photo that is lost. */
export async function removeBytes(storageKeys: string[]): Promise<void> {
  const port = await filesPort();
  for (const key of storageKeys) {
    await port.remove(key).catch((error) => logBug('keeping/remove-bytes', error));
  }
}
