import { isIPv6 } from 'node:net';

/**
 * What attempts are counted by: an IPv4 address, or the first 64 bits of an IPv6 address, as anyone
 * who has one address of such a network has them all.
 */
export function networkOf(address = ''): string {
  const mapped = /^::ffff:([\d.]+)$/i.exec(address)?.[1];
  if (mapped || !isIPv6(address)) return mapped ?? address;
  const [left = '', right] = address.split('::');
  const groups = (part = '') => part.split(':').filter((group) => group !== '');
  const after = groups(right);
  const zeros = right === undefined ? 0 : 8 - groups(left).length - after.length;
  const all = [...groups(left), ...Array<string>(zeros).fill('0'), ...after];
  return `${all
    .slice(0, 4)
    .map((group) => Number.parseInt(group, 16).toString(16))
    .join(':')}::/64`;
}
