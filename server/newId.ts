import { randomBytes } from 'node:crypto';

/** UUIDv7 (RFC 9562): 48 bits of milliseconds, version, variant, 74 random bits; sorts by time, can't be guessed. */
export function newId(milliseconds: number = Date.now(), random: Uint8Array = randomBytes(10)): string {
  const bytes = Buffer.alloc(16);
  bytes.writeUIntBE(milliseconds, 0, 6);
  bytes.set(random.subarray(0, 10), 6);
  bytes.writeUInt8((bytes.readUInt8(6) & 0x0f) | 0x70, 6);
  bytes.writeUInt8((bytes.readUInt8(8) & 0x3f) | 0x80, 8);
  const hex = bytes.toString('hex');
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-${hex.slice(12, 16)}-${hex.slice(16, 20)}-${hex.slice(20)}`;
}
