/** Why the camera cannot be used, in one sentence; the scanner and the pad go on working. */
export const cameraProblem = (error: unknown): string => {
  const text = String(error instanceof Error ? `${error.name} ${error.message}` : error);
  if (/NotAllowed|Permission/i.test(text))
    return 'The browser keeps the camera shut. Allow it in the page’s settings.';
  if (/NotFound|Overconstrained|device not found/i.test(text)) return 'No camera on this device.';
  if (/NotReadable|in use/i.test(text)) return 'Another program holds the camera.';
  return 'The camera does not start.';
};

/** Why a camera is out of reach before it is even asked for; null when it may be tried. */
export const cameraBarrier = (isSecureContext: boolean, hasDevices: boolean): string | null => {
  if (!isSecureContext) return 'The camera works only over https or on this very computer.';
  return hasDevices ? null : 'This browser gives no camera to pages.';
};
