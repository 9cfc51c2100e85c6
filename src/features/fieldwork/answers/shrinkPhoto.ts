/** A photo made fit to travel: at most 1600 px and 400 kB, redrawn so that no position or other metadata is left. */
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex } from '@noble/hashes/utils.js';

export interface Photo {
  sha256: string;
  bytes: number;
  /** Object URL for showing it. */
  url: string;
}

// sync.md: photos are downscaled to ≤ 1600 px and ≤ 400 kB.
const maxSide = 1600;
const maxBytes = 400_000;
const qualities = [0.82, 0.7, 0.55, 0.4];

function drawn(image: ImageBitmap, side: number): HTMLCanvasElement {
  const scale = Math.min(1, side / Math.max(image.width, image.height));
  const canvas = document.createElement('canvas');
  canvas.width = Math.round(image.width * scale);
  canvas.height = Math.round(image.height * scale);
  canvas.getContext('2d')?.drawImage(image, 0, 0, canvas.width, canvas.height);
  return canvas;
}

const jpeg = (canvas: HTMLCanvasElement, quality: number): Promise<Blob> =>
  new Promise((resolve, reject) => {
    canvas.toBlob(
      (blob) => {
        if (blob) resolve(blob);
        else reject(new Error('this image cannot be drawn'));
      },
      'image/jpeg',
      quality,
    );
  });

async function smallEnough(image: ImageBitmap): Promise<Blob> {
  for (const side of [maxSide, maxSide / 2]) {
    const canvas = drawn(image, side);
    for (const quality of qualities) {
      const blob = await jpeg(canvas, quality);
      if (blob.size <= maxBytes) return blob;
    }
  }
  throw new Error('this image stays larger than 400 kB');
}

/** @throws Error when the file is no image this browser can draw. */
export async function shrinkPhoto(file: Blob): Promise<Photo> {
  const image = await createImageBitmap(file, { imageOrientation: 'from-image' });
  const blob = await smallEnough(image);
  image.close();
  const hash = bytesToHex(sha256(new Uint8Array(await blob.arrayBuffer())));
  return { sha256: hash, bytes: blob.size, url: URL.createObjectURL(blob) };
}
