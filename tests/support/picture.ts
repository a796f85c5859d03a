import type { Page } from 'playwright-core';

/** A photo of a side on a table with a rule of 1 m beside it: 480 × 270 pixels, 5 mm each. Drawn by the browser. */
export async function photoOfSide(page: Page, type = 'image/png'): Promise<Buffer> {
  const address = await page.evaluate((wanted) => {
    const canvas = document.createElement('canvas');
    [canvas.width, canvas.height] = [480, 270];
    const brush = canvas.getContext('2d');
    if (!brush) throw new Error('This browser cannot draw.');
    brush.fillStyle = '#8a8f94';
    brush.fillRect(0, 0, 480, 270);
    brush.fillStyle = '#a8683c';
    brush.fillRect(40, 30, 400, 180);
    brush.fillStyle = '#5a2f17';
    brush.fillRect(120, 80, 20, 14);
    brush.fillStyle = '#ffffff';
    brush.fillRect(140, 230, 200, 8);
    return canvas.toDataURL(wanted);
  }, type);
  return Buffer.from(address.split(',')[1] ?? '', 'base64');
}

/** The ends of the rule, as shares of the photo. */
export const photoRule = {
  from: { x: 140 / 480, y: 234 / 270 },
  to: { x: 340 / 480, y: 234 / 270 },
};
