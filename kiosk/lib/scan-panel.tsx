import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { CodePad } from './code-pad.tsx';
import { ScanFrame } from './scan-frame.tsx';
import { scanWords, type ScannedThing } from './scanned-things.ts';

/** Props of {@link ScanPanel}. */
export interface ScanPanelProps {
  readonly of?: ScannedThing;
  readonly onCode: (code: string) => void;
}

/** The three ways to name a flask or a lot: camera, scanner, pad. */
export const ScanPanel = ({ of = 'flask', onCode }: ScanPanelProps) => {
  const [isTyping, setIsTyping] = useState(false);
  return (
    <section
      aria-labelledby="scan-heading"
      className="grid min-h-0 grid-rows-[minmax(0,1fr)_auto] gap-4 rounded-[28px] border-[3px] border-line bg-panel p-5 portrait:grid-cols-[minmax(0,1fr)_minmax(0,1fr)] portrait:grid-rows-1"
    >
      <ScanFrame onCode={onCode} className="min-h-[160px]" />
      <div className="grid content-center gap-3">
        <h2 id="scan-heading" className="text-[34px] leading-tight font-black">
          {scanWords[of].show}
        </h2>
        <Button size="terminal" icon="pad" onClick={() => setIsTyping(true)}>
          Type its number
        </Button>
      </div>
      {isTyping ? (
        <CodePad
          of={of}
          onClose={() => setIsTyping(false)}
          onCode={(code) => {
            setIsTyping(false);
            onCode(code);
          }}
        />
      ) : null}
    </section>
  );
};
