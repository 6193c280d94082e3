import { randomBytes } from 'node:crypto';

let lastTimeMs = 0;
let counter = 0;

/**
 * A UUIDv7 (RFC 9562): 48 bits of time, then a 12-bit counter within the millisecond (its method 1), then chance.
 * Ids made by one process rise strictly, so that "newest first" is "by id".
 */
export function newId(nowMs: number = Date.now()): string {
  const timeMs = Math.max(nowMs, lastTimeMs);
  counter = timeMs === lastTimeMs ? counter + 1 : 0;
  lastTimeMs = timeMs;
  if (counter > 0xfff) {
    lastTimeMs += 1;
    counter = 0;
  }
  const bytes = randomBytes(16);
  bytes.writeUIntBE(lastTimeMs, 0, 6);
  bytes.writeUInt16BE(0x7000 | counter, 6);
  bytes.writeUInt8(0x80 | (bytes.readUInt8(8) & 0x3f), 8);
  const hex = bytes.toString('hex');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}
