import { mkdtemp, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import QRCode from 'qrcode';

const width = 640;
const height = 480;
const quietModules = 4;
const frames = 5;

/** The luma plane of a frame with a QR code in its middle, as large as fits. */
const lumaOf = (text: string): Buffer => {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'M' });
  const scale = Math.floor(height / (modules.size + 2 * quietModules));
  const side = modules.size * scale;
  const [left, top] = [Math.floor((width - side) / 2), Math.floor((height - side) / 2)];
  const luma = Buffer.alloc(width * height, 235);
  for (let y = 0; y < side; y += 1) {
    for (let x = 0; x < side; x += 1) {
      const isDark = modules.get(Math.floor(y / scale), Math.floor(x / scale)) !== 0;
      if (isDark) luma[(top + y) * width + left + x] = 16;
    }
  }
  return luma;
};

/** Writes a video (YUV4MPEG2, 640 × 480) that shows a QR code, for Chromium's fake camera; resolves to its path. */
export const makeQrVideo = async (text: string): Promise<string> => {
  const luma = lumaOf(text);
  const chroma = Buffer.alloc((width * height) / 2, 128);
  const frame = Buffer.concat([Buffer.from('FRAME\n'), luma, chroma]);
  const header = Buffer.from(`YUV4MPEG2 W${width} H${height} F10:1 Ip A1:1 C420jpeg\n`);
  const path = join(await mkdtemp(join(tmpdir(), 'qr-video-')), 'code.y4m');
  await writeFile(path, Buffer.concat([header, ...Array.from({ length: frames }, () => frame)]));
  return path;
};
