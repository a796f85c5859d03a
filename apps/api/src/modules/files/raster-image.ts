/** A picture in pixels, as its own bytes say. */
export interface RasterImage {
  type: 'image/png' | 'image/jpeg' | 'image/webp';
  widthPx: number;
  heightPx: number;
}

/**
 * What kind of picture this is, by its content and whatever it is called; undefined for anything else, and for
 * one that was cut off. Sources: W3C PNG (signature, IHDR, IEND), ITU-T T.81 annex B (markers), RFC 9649 (WebP).
 */
export function rasterImageOf(bytes: Buffer): RasterImage | undefined {
  return pngOf(bytes) ?? jpegOf(bytes) ?? webpOf(bytes);
}

const pngBegins = Buffer.from('\x89PNG\r\n\x1a\n', 'latin1');

function pngOf(bytes: Buffer): RasterImage | undefined {
  if (bytes.length < 45 || !bytes.subarray(0, 8).equals(pngBegins)) return undefined;
  if (textAt(bytes, 12) !== 'IHDR' || !bytes.includes('IEND', 33, 'latin1')) return undefined;
  return { type: 'image/png', widthPx: bytes.readUInt32BE(16), heightPx: bytes.readUInt32BE(20) };
}

/** Start of frame: the markers C0 to CF but for the tables C4, C8 and CC. */
const isFrame = (marker: number) =>
  marker >= 0xc0 && marker <= 0xcf && ![0xc4, 0xc8, 0xcc].includes(marker);
const jpegEnds = Buffer.from([0xff, 0xd9]);

function jpegOf(bytes: Buffer): RasterImage | undefined {
  if (bytes.length < 4 || bytes.readUInt16BE(0) !== 0xffd8) return undefined;
  let at = 2;
  while (at + 9 <= bytes.length) {
    if (bytes[at] !== 0xff) return undefined;
    const marker = bytes.readUInt8(at + 1);
    if (marker === 0xff) at += 1;
    else if (isFrame(marker)) {
      if (!bytes.includes(jpegEnds, at)) return undefined;
      const [heightPx, widthPx] = [bytes.readUInt16BE(at + 5), bytes.readUInt16BE(at + 7)];
      return { type: 'image/jpeg', widthPx, heightPx };
    } else at += 2 + bytes.readUInt16BE(at + 2);
  }
  return undefined;
}

function webpOf(bytes: Buffer): RasterImage | undefined {
  if (bytes.length < 30 || textAt(bytes, 0) !== 'RIFF' || textAt(bytes, 8) !== 'WEBP')
    return undefined;
  if (bytes.readUInt32LE(4) + 8 > bytes.length) return undefined;
  const size = webpSize(bytes);
  return size && { type: 'image/webp', widthPx: size[0], heightPx: size[1] };
}

/** By its first chunk: extended, lossless or lossy. */
function webpSize(bytes: Buffer): [number, number] | undefined {
  switch (textAt(bytes, 12)) {
    case 'VP8X':
      return [bytes.readUIntLE(24, 3) + 1, bytes.readUIntLE(27, 3) + 1];
    case 'VP8L': {
      const bits = bytes.readUInt32LE(21);
      return [(bits & 0x3fff) + 1, ((bits >>> 14) & 0x3fff) + 1];
    }
    case 'VP8 ':
      return [bytes.readUInt16LE(26) & 0x3fff, bytes.readUInt16LE(28) & 0x3fff];
    default:
      return undefined;
  }
}

const textAt = (bytes: Buffer, at: number) => bytes.toString('latin1', at, at + 4);
