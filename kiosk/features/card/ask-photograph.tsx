import { useEffect, useRef, useState, type ReactNode } from 'react';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';
import { Icon } from '#src/ui/icon.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { pictureOfFile, pictureOfVideo } from '#kiosk/lib/take-picture.ts';
import { useCameraStream } from '#kiosk/lib/use-camera-stream.ts';

/** The parts of a screen that takes a photograph. */
export interface AskPhotographParts {
  readonly state: ReactNode;
  readonly gauge: ReactNode;
  readonly actions: ReactNode;
}

/** Props of {@link AskPhotograph}. */
export interface AskPhotographProps {
  /** The way back or past it, at the left of the actions; null for none. */
  readonly back: ReactNode;
  /** Takes the picture, a JPEG of at most 1600 px; resolves once it is kept. */
  readonly onKept: (picture: Blob) => Promise<void>;
  /** Puts the parts into the screen that asks. */
  readonly children: (parts: AskPhotographParts) => ReactNode;
}

interface SeenProps {
  readonly stream: MediaStream;
  readonly onVideo: (video: HTMLVideoElement | null) => void;
}

const Seen = ({ stream, onVideo }: SeenProps) => (
  <video
    ref={(video) => {
      // Set anew it would begin anew, and blink.
      if (video && video.srcObject !== stream) video.srcObject = stream;
      onVideo(video);
    }}
    autoPlay
    muted
    playsInline
    aria-label="What the camera sees"
    className="size-full rounded-[22px] bg-panel object-cover"
  />
);

interface Taken {
  readonly picture: Blob;
  readonly url: string;
}

/** Opens the device's own camera program, which works where a page may not open the camera itself. */
const FromFile = ({ onFile }: { readonly onFile: (file: File) => void }) => (
  <label
    className={buttonClass({ size: 'terminal' }, 'grow-2 basis-0 cursor-pointer has-focus-visible:outline-4')}
  >
    <Icon name="camera" />
    The device’s own camera
    <input
      type="file"
      accept="image/*"
      capture="environment"
      className="sr-only"
      onChange={({ target }) => {
        const [file] = target.files ?? [];
        if (file) onFile(file);
        target.value = '';
      }}
    />
  </label>
);

/** Takes a photograph: seen, taken, looked at, then kept or taken again; without a camera it says why and what else there is. */
export const AskPhotograph = ({ back, onKept, children }: AskPhotographProps) => {
  const [taken, setTaken] = useState<Taken | null>(null);
  const [fault, setFault] = useState<string | null>(null);
  const [isKeeping, setIsKeeping] = useState(false);
  const { stream, problem } = useCameraStream(taken === null);
  const video = useRef<HTMLVideoElement>(null);
  useEffect(() => () => (taken ? URL.revokeObjectURL(taken.url) : undefined), [taken]);
  const look = (taking: Promise<Blob>): void => {
    setFault(null);
    taking.then(
      (picture) => setTaken({ picture, url: URL.createObjectURL(picture) }),
      () => setFault('That is not a picture this browser can read. Take it again.'),
    );
  };
  const keep = (): void => {
    if (!taken || isKeeping) return;
    setIsKeeping(true);
    void onKept(taken.picture).finally(() => setIsKeeping(false));
  };
  if (taken) {
    return children({
      state: <StateMark state="ready" text="Look at it: is it sharp?" size="terminal" />,
      gauge: <img src={taken.url} alt="What was taken" className="size-full rounded-[22px] object-contain" />,
      actions: (
        <>
          <Button size="terminal" icon="camera" onClick={() => setTaken(null)}>
            Take it again
          </Button>
          <Button kind="main" size="terminal" icon="tick" className="grow-2" busy={isKeeping} onClick={keep}>
            Keep it
          </Button>
        </>
      ),
    });
  }
  const wrong = fault ?? problem;
  return children({
    state: wrong ? (
      <span role="alert">
        <StateMark state="caution" text={wrong} size="terminal" />
      </span>
    ) : (
      <StateMark state="wait" text={stream ? 'Hold still' : 'Opening the camera'} size="terminal" />
    ),
    gauge: stream ? (
      <Seen
        stream={stream}
        onVideo={(element) => {
          video.current = element;
        }}
      />
    ) : (
      <div className="grid h-full place-items-center rounded-[22px] border-[3px] border-dashed border-soft text-soft">
        <Icon name="camera" className="size-32" />
      </div>
    ),
    actions: (
      <>
        {back}
        {problem ? (
          <FromFile onFile={(file) => look(pictureOfFile(file))} />
        ) : (
          <Button
            kind={stream ? 'main' : 'blocked'}
            size="terminal"
            icon="camera"
            className="grow-2"
            onClick={() => {
              if (video.current) look(pictureOfVideo(video.current));
            }}
          >
            Take it
          </Button>
        )}
      </>
    ),
  });
};
