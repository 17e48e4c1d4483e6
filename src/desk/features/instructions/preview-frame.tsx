import { useCallback, useEffect, useRef } from 'react';
import { previewReady, type PreviewMessage } from '#src/lib/preview-message.ts';
import { Panel } from '#src/desk/parts/panel.tsx';

/** The terminal's own page for a card under an instruction that is not approved yet; it makes no record. */
const address = '/kiosk/preview';

/** An instruction exactly as the terminal shows it: its own page in a frame, which is sent every change. */
export const PreviewFrame = ({ instruction }: { readonly instruction: PreviewMessage }) => {
  const frame = useRef<HTMLIFrameElement>(null);
  const send = useCallback(
    () => frame.current?.contentWindow?.postMessage(instruction, window.location.origin),
    [instruction],
  );
  useEffect(() => {
    send();
    const answer = ({ source, origin, data }: MessageEvent): void => {
      const isOurs = source === frame.current?.contentWindow && origin === window.location.origin;
      if (isOurs && data === previewReady) send();
    };
    window.addEventListener('message', answer);
    return () => window.removeEventListener('message', answer);
  }, [send]);
  return (
    <div className="screen-only hidden sm:block">
      <Panel title="At the terminal">
        <div className="h-[352px] w-full max-w-[560px] overflow-hidden rounded-[18px] border-2 border-line bg-panel">
          <iframe
            ref={frame}
            src={address}
            title="The card at the terminal"
            onLoad={send}
            className="h-[800px] w-[1280px] origin-top-left scale-[0.4375] border-0"
          />
        </div>
        <p className="max-w-[560px] text-[15px] text-soft">
          Exactly as the terminal shows it, with what is typed here and nothing recorded. Choose method, alloy
          and role in its own bar.
        </p>
      </Panel>
    </div>
  );
};
