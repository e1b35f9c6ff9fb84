import { BlockList, isIP } from 'node:net';
import { env } from '@/server/base/env';

/** Addresses that are nobody's on the open net: loopback, private, link-local, carrier, tests, multicast (RFC 6890). */
const notPublic = new BlockList();
for (const [net, bits] of [
  ['0.0.0.0', 8],
  ['10.0.0.0', 8],
  ['100.64.0.0', 10],
  ['127.0.0.0', 8],
  ['169.254.0.0', 16],
  ['172.16.0.0', 12],
  ['192.0.0.0', 24],
  ['192.0.2.0', 24],
  ['192.168.0.0', 16],
  ['198.18.0.0', 15],
  ['198.51.100.0', 24],
  ['203.0.113.0', 24],
  ['224.0.0.0', 4],
  ['240.0.0.0', 4],
] as const) {
  notPublic.addSubnet(net, bits, 'ipv4');
}
for (const [net, bits] of [
  ['::', 127],
  ['::ffff:0:0', 96],
  ['64:ff9b::', 96],
  ['100::', 64],
  ['2001:db8::', 32],
  ['fc00::', 7],
  ['fe80::', 10],
  ['ff00::', 8],
] as const) {
  notPublic.addSubnet(net, bits, 'ipv6');
}

/** Whether a numeric address is one of the open net. */
export function isPublicIp(address: string): boolean {
  const family = isIP(address);
  if (family === 0) return false;
  return !notPublic.check(address, family === 4 ? 'ipv4' : 'ipv6');
}

/**
 * Why nothing is sent to this address, or null. A shop must not make our server knock at doors behind its
 * own wall. In the demo and in tests this machine itself may be told, without encryption.
 */
export function refusedAddress(text: string): string | null {
  if (!URL.canParse(text)) return 'That is no address.';
  const url = new URL(text);
  if (url.username || url.password) return 'Leave name and password out of the address.';
  if (isOwnMachineAllowed() && url.hostname === 'localhost' && url.protocol === 'http:')
    return null;
  if (url.protocol !== 'https:') return 'The address must begin with https://.';
  const host = url.hostname.replace(/^\[|\]$/g, '');
  if (isIP(host) !== 0) {
    return isPublicIp(host) ? null : 'That address is not on the open net.';
  }
  if (!host.includes('.') || /\.(localhost|local|internal|home\.arpa)$/i.test(host)) {
    return 'That address is not on the open net.';
  }
  return null;
}

export function isOwnMachineAllowed(): boolean {
  const { demo, production } = env();
  return demo || !production;
}
