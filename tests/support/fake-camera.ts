import { createRequire } from 'node:module';

interface Code {
  modules: { size: number; get: (row: number, column: number) => number };
}

const api = createRequire(new URL('../../apps/api/package.json', import.meta.url));
const codes = api('qrcode') as { create: (text: string) => Code };

const [width, height] = [640, 480];
const [white, black, noColour] = [235, 16, 128];

/** A film of two pictures, both of a sheet of paper with this code on it; Y4M, as a fake camera plays it. */
export function filmOfCode(text: string): Buffer {
  const head = Buffer.from(`YUV4MPEG2 W${width} H${height} F10:1 Ip A1:1 C420mpeg2\n`, 'latin1');
  const colours = Buffer.alloc((width * height) / 2, noColour);
  const picture = [Buffer.from('FRAME\n', 'latin1'), greyOf(codes.create(text)), colours];
  return Buffer.concat([head, ...picture, ...picture]);
}

/** The code in the middle, as large as a quiet edge of four modules leaves it. */
function greyOf({ modules }: Code): Buffer {
  const grey = Buffer.alloc(width * height, white);
  const pixels = Math.floor(height / (modules.size + 8));
  const side = pixels * modules.size;
  const [left, top] = [Math.floor((width - side) / 2), Math.floor((height - side) / 2)];
  for (let y = 0; y < side; y += 1) {
    for (let x = 0; x < side; x += 1) {
      const dark = modules.get(Math.floor(y / pixels), Math.floor(x / pixels));
      if (dark) grey[(top + y) * width + left + x] = black;
    }
  }
  return grey;
}
