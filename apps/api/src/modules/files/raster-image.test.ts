import { describe, expect, it } from 'vitest';
import { rasterImageOf } from './raster-image.ts';

function webp(chunk: string, hex: string): Buffer {
  const data = Buffer.concat([Buffer.from(hex, 'hex'), Buffer.alloc(16)]);
  const sizes = Buffer.alloc(8);
  sizes.writeUInt32LE(12 + data.length, 0);
  sizes.writeUInt32LE(data.length, 4);
  const [whole, part] = [sizes.subarray(0, 4), sizes.subarray(4)];
  return Buffer.concat([Buffer.from('RIFF'), whole, Buffer.from(`WEBP${chunk}`), part, data]);
}

/** Two segments that say nothing of the size, one of them a table, then the frame. */
const jpeg = Buffer.from('ffd8ffe0000601020304ffc400040001ffc2000b080190025801011100ffd9', 'hex');
const png = Buffer.concat([
  Buffer.from('89504e470d0a1a0a', 'hex'),
  Buffer.from('0000000d49484452000002580000019008020000000badcafe', 'hex'),
  Buffer.from('0000000049454e44ae426082', 'hex'),
]);

describe('a picture of 600 × 400 pixels', () => {
  it.each([
    ['image/png', png],
    ['image/jpeg', jpeg],
    ['image/webp', webp('VP8 ', '3001009d012a58029001')],
    ['image/webp', webp('VP8L', '2f57c26300')],
    ['image/webp', webp('VP8X', '100000005702008f0100')],
  ])('is known as %s by its bytes', (type, bytes) => {
    expect(rasterImageOf(bytes)).toEqual({ type, widthPx: 600, heightPx: 400 });
  });

  it.each([
    ['a PNG', png],
    ['a JPEG', jpeg],
    ['a WebP', webp('VP8 ', '3001009d012a58029001')],
  ])('is none when %s is cut off anywhere', (_what, bytes) => {
    for (let length = 0; length < bytes.length - 8; length += 1)
      expect(rasterImageOf(bytes.subarray(0, length))).toBeUndefined();
  });
});
