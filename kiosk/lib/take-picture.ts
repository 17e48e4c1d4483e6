/** The longest side of a picture that is kept, px. */
export const longestSidePx = 1600;
const jpegQuality = 0.85;

/** A size that keeps its proportions and is no longer than `longest` on either side, in whole pixels. */
export const fitWithin = (
  { width, height }: { readonly width: number; readonly height: number },
  longest: number,
): { readonly width: number; readonly height: number } => {
  const scale = Math.min(1, longest / Math.max(width, height));
  return { width: Math.max(1, Math.round(width * scale)), height: Math.max(1, Math.round(height * scale)) };
};

const draw = (
  source: CanvasImageSource,
  size: { readonly width: number; readonly height: number },
): Promise<Blob> => {
  const canvas = document.createElement('canvas');
  Object.assign(canvas, fitWithin(size, longestSidePx));
  const context = canvas.getContext('2d');
  if (!context) return Promise.reject(new Error('This browser draws no pictures.'));
  context.drawImage(source, 0, 0, canvas.width, canvas.height);
  return new Promise((resolve, reject) => {
    canvas.toBlob(
      (blob) => (blob ? resolve(blob) : reject(new Error('The picture could not be kept.'))),
      'image/jpeg',
      jpegQuality,
    );
  });
};

/** What a camera sees at this moment, as a JPEG of at most 1600 px. */
export const pictureOfVideo = (video: HTMLVideoElement): Promise<Blob> =>
  draw(video, { width: video.videoWidth, height: video.videoHeight });

/** A picture that the device's own camera program took, as a JPEG of at most 1600 px; rejects when it is none. */
export const pictureOfFile = async (file: Blob): Promise<Blob> => {
  const bitmap = await createImageBitmap(file);
  try {
    return await draw(bitmap, bitmap);
  } finally {
    bitmap.close();
  }
};
