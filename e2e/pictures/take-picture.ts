import { writeFileSync } from 'node:fs';
import type { Page } from '@playwright/test';
import { indexedPng } from './indexed-png';

/** Takes a picture of a page as it stands and writes it small. */
export async function takePicture(page: Page, file: string): Promise<void> {
  const picture = await page.screenshot({ caret: 'hide' });
  // The browser reads its own picture; an empty page has no policy that forbids it.
  const emptyPage = await page.context().newPage();
  const { width, height, base64 } = await emptyPage.evaluate(async (source) => {
    const answer = await fetch(`data:image/png;base64,${source}`);
    const bitmap = await createImageBitmap(await answer.blob());
    const canvas = new OffscreenCanvas(bitmap.width, bitmap.height);
    const context = canvas.getContext('2d');
    if (context === null) throw new Error('There is no canvas.');
    context.drawImage(bitmap, 0, 0);
    const { data } = context.getImageData(0, 0, bitmap.width, bitmap.height);
    const reader = new FileReader();
    const url = await new Promise<string>((resolve) => {
      reader.onload = () => resolve(typeof reader.result === 'string' ? reader.result : '');
      reader.readAsDataURL(new Blob([data]));
    });
    return { width: bitmap.width, height: bitmap.height, base64: url.slice(url.indexOf(',') + 1) };
  }, picture.toString('base64'));
  await emptyPage.close();
  writeFileSync(file, indexedPng({ width, height, data: Buffer.from(base64, 'base64') }));
}
