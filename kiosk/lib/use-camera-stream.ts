import { useEffect, useState } from 'react';
import { cameraBarrier, cameraProblem } from './camera-problem.ts';

/** What the device's camera sees, or why it cannot be used; neither while it is still starting. */
export interface CameraStream {
  readonly stream: MediaStream | null;
  readonly problem: string | null;
}

const wanted: MediaStreamConstraints = {
  audio: false,
  video: { facingMode: 'environment', width: { ideal: 1920 }, height: { ideal: 1080 } },
};

const release = (stream: MediaStream): void => {
  for (const track of stream.getTracks()) track.stop();
};

/** Opens the camera while `isWanted`, and lets go of it after. */
export const useCameraStream = (isWanted: boolean): CameraStream => {
  const [barrier] = useState(() => cameraBarrier(window.isSecureContext, 'mediaDevices' in navigator));
  const [camera, setCamera] = useState<CameraStream>({ stream: null, problem: null });
  useEffect(() => {
    if (!isWanted || barrier !== null) return;
    let isGone = false;
    const opening = navigator.mediaDevices.getUserMedia(wanted);
    opening.then(
      (stream) => (isGone ? release(stream) : setCamera({ stream, problem: null })),
      (error: unknown) => (isGone ? undefined : setCamera({ stream: null, problem: cameraProblem(error) })),
    );
    return () => {
      isGone = true;
      opening.then(release).catch(() => undefined);
      setCamera({ stream: null, problem: null });
    };
  }, [isWanted, barrier]);
  return barrier === null ? camera : { stream: null, problem: barrier };
};
