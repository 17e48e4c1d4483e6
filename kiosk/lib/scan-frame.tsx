import { useEffect, useEffectEvent, useId, useState } from 'react';
import { Icon } from '#src/ui/icon.tsx';
import { cameraBarrier, cameraProblem } from './camera-problem.ts';

/** Props of {@link ScanFrame}. */
export interface ScanFrameProps {
  /** Runs with what a code says, at most once each few seconds for the same one. */
  readonly onCode: (code: string) => void;
  readonly className?: string;
}

const framesPerSecond = 10;
const sameCodeAgainMs = 3_000;

const barrier = (): string | null => cameraBarrier(window.isSecureContext, 'mediaDevices' in navigator);

const startScanner = async (
  elementId: string,
  onText: (text: string) => void,
): Promise<() => Promise<void>> => {
  const { Html5Qrcode, Html5QrcodeSupportedFormats } = await import('html5-qrcode');
  const scanner = new Html5Qrcode(elementId, {
    formatsToSupport: [Html5QrcodeSupportedFormats.QR_CODE],
    verbose: false,
  });
  await scanner.start({ facingMode: 'environment' }, { fps: framesPerSecond }, onText, undefined);
  return async () => {
    await scanner.stop();
    scanner.clear();
  };
};

const useCamera = (elementId: string, onCode: (code: string) => void) => {
  const [problem, setProblem] = useState<string | null>(barrier);
  const [isSeeing, setIsSeeing] = useState(false);
  const take = useEffectEvent(onCode);
  const canTry = problem === null;
  useEffect(() => {
    if (!canTry) return;
    let isGone = false;
    let last = { text: '', atMs: 0 };
    const hear = (text: string): void => {
      const atMs = performance.now();
      const isAgain = text === last.text && atMs - last.atMs < sameCodeAgainMs;
      last = isAgain ? last : { text, atMs };
      if (!isAgain && !isGone) take(text);
    };
    let starting: ReturnType<typeof startScanner> | undefined;
    // Not at once: a frame that is taken down again right away must never have asked for the camera.
    const timer = window.setTimeout(() => {
      starting = startScanner(elementId, hear);
      starting.then(
        () => (isGone ? undefined : setIsSeeing(true)),
        (error: unknown) => (isGone ? undefined : setProblem(cameraProblem(error))),
      );
    }, 0);
    return () => {
      isGone = true;
      window.clearTimeout(timer);
      setIsSeeing(false);
      // A scanner that is still starting can only be stopped once it has started.
      starting?.then((stop) => stop()).catch(() => undefined);
    };
  }, [elementId, canTry]);
  return { problem, isSeeing };
};

const corner = 'absolute size-14 border-ember';

const Corners = () => (
  <div aria-hidden="true" className="pointer-events-none absolute inset-3">
    <span className={`${corner} top-0 left-0 border-t-[9px] border-l-[9px]`} />
    <span className={`${corner} top-0 right-0 border-t-[9px] border-r-[9px]`} />
    <span className={`${corner} bottom-0 left-0 border-b-[9px] border-l-[9px]`} />
    <span className={`${corner} right-0 bottom-0 border-r-[9px] border-b-[9px]`} />
  </div>
);

/** The place to hold a flask's code to the camera; without a camera it says why, and what works instead. */
export const ScanFrame = ({ onCode, className }: ScanFrameProps) => {
  const elementId = `camera-${useId().replace(/[^a-z0-9]/gi, '')}`;
  const { problem, isSeeing } = useCamera(elementId, onCode);
  return (
    <div
      role="group"
      aria-label="Camera"
      data-camera={problem ? 'none' : isSeeing ? 'on' : 'starting'}
      className={`relative grid min-h-0 place-items-center overflow-hidden rounded-[22px] bg-ground ${className ?? ''}`}
    >
      <div
        id={elementId}
        className="!absolute inset-0 [&_video]:!size-full [&_video]:object-cover"
        aria-hidden="true"
      />
      {isSeeing ? null : (
        <div className="relative grid justify-items-center gap-3 px-10 py-8 text-center text-xl leading-snug text-soft">
          <Icon name="camera" className="size-20" />
          <p>{problem ? `${problem} A scanner and the pad work.` : 'Opening the camera'}</p>
        </div>
      )}
      <Corners />
    </div>
  );
};
