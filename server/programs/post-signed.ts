import { lookup } from 'node:dns';
import { request as httpRequest } from 'node:http';
import { request as httpsRequest } from 'node:https';
import type { LookupFunction } from 'node:net';
import { isOwnMachineAllowed, isPublicIp, refusedAddress } from './public-address';

const patienceMs = 10_000;
const mostAnswerBytes = 4_000;

export type Posted = { isTaken: boolean; words: string };

/**
 * Posts JSON to an address of the open net. The name is looked up for this connection and the answer judged
 * before it is used, so that a name cannot point inward after it was checked; nothing is followed elsewhere.
 */
export function postSigned(
  address: string,
  body: string,
  headers: Record<string, string>,
): Promise<Posted> {
  const why = refusedAddress(address);
  if (why) return Promise.resolve({ isTaken: false, words: why });
  const url = new URL(address);
  const send = url.protocol === 'https:' ? httpsRequest : httpRequest;
  return new Promise((resolve) => {
    const failed = (words: string) => resolve({ isTaken: false, words });
    const request = send(
      url,
      {
        method: 'POST',
        headers: {
          ...headers,
          'content-type': 'application/json',
          'content-length': Buffer.byteLength(body),
        },
        lookup: publicLookup,
        timeout: patienceMs,
      },
      (answer) => {
        let bytes = 0;
        answer.on('data', (chunk: Buffer) => {
          bytes += chunk.length;
          if (bytes > mostAnswerBytes) answer.destroy();
        });
        const status = answer.statusCode ?? 0;
        resolve({ isTaken: status >= 200 && status < 300, words: `It answered ${status}.` });
      },
    );
    request.once('timeout', () => {
      request.destroy();
      failed('It did not answer within 10 seconds.');
    });
    request.once('error', (error) => failed(reachWords(error)));
    request.end(body);
  });
}

const publicLookup: LookupFunction = (hostname, options, answer) => {
  lookup(hostname, { ...options, all: true }, (error, found) => {
    if (error) return answer(error, '');
    const allowed = found.filter(
      ({ address }) => isPublicIp(address) || (hostname === 'localhost' && isOwnMachineAllowed()),
    );
    const [first] = allowed;
    if (!first) return answer(new Error('not on the open net'), '');
    return options.all ? answer(null, allowed) : answer(null, first.address, first.family);
  });
};

function reachWords(error: Error): string {
  if (error.message === 'not on the open net')
    return 'Its name leads to no address on the open net.';
  const { code } = error as NodeJS.ErrnoException;
  return `It could not be reached${code ? ` (${code})` : ''}.`;
}
