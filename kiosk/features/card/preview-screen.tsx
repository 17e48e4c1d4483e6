import { useEffect, useMemo, useState } from 'react';
import {
  isPreviewMessage,
  previewReady,
  type PreviewMessage,
  type PreviewWork,
} from '#src/lib/preview-message.ts';
import { useTheme } from '#src/lib/theme.ts';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';
import { PresenceContext, type Presence } from '#kiosk/lib/presence.ts';
import { exampleCard } from './example-card.ts';
import { PracticeWalk } from './practice-walk.tsx';

const plain: PreviewWork = { method: 'vacuum', family: 'yellow-gold', role: 'caster', hazards: [] };

/** The page that opened the preview or holds it in a frame; null when it was opened by its address. */
const openerOf = (page: Window): Window | null => {
  if (page.parent !== page) return page.parent;
  return page.opener as Window | null;
};

/** The last instruction handed in, with how many there have been. */
const useHandedIn = (): { readonly message: PreviewMessage; readonly count: number } | null => {
  const [handedIn, setHandedIn] = useState<{ message: PreviewMessage; count: number } | null>(null);
  useEffect(() => {
    const opener = openerOf(window);
    const hear = ({ origin, source, data }: MessageEvent<unknown>): void => {
      if (origin !== window.location.origin || source !== opener || !isPreviewMessage(data)) return;
      setHandedIn((before) => ({ message: data, count: (before?.count ?? 0) + 1 }));
    };
    window.addEventListener('message', hear);
    opener?.postMessage(previewReady, window.location.origin);
    return () => window.removeEventListener('message', hear);
  }, []);
  return handedIn;
};

const presenceOf = ({ role }: PreviewWork): Presence => ({
  person: { id: 'preview', name: role === 'apprentice' ? 'Apprentice' : 'Caster', roles: [role] },
  terminal: { id: 'preview', name: 'Preview', bay: 'preview' },
  studio: {
    name: 'Preview',
    units: { temperature: 'C', mass: 'g' },
    idleLockS: 0,
    timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
    marksPlace: 'ISO 9202',
  },
  signOut: () => undefined,
});

const Walk = ({ message }: { readonly message: PreviewMessage }) => {
  const [round, setRound] = useState(0);
  const [card, presence] = useMemo(() => {
    const { method, family, role, hazards, ...instruction } = { ...plain, ...message };
    const work = { method, family, role, hazards };
    return [exampleCard(work, instruction), presenceOf(work)] as const;
  }, [message]);
  return (
    <PresenceContext value={presence}>
      <PracticeWalk key={round} card={card} kind="preview" onLeave={() => setRound(round + 1)} />
    </PresenceContext>
  );
};

/** An instruction handed in by the page around this one, shown exactly as a card shows it, on an example; nothing is recorded. */
export const PreviewScreen = () => {
  useTheme();
  const handedIn = useHandedIn();
  if (handedIn) return <Walk key={handedIn.count} message={handedIn.message} />;
  return (
    <MessageScreen
      state="wait"
      mark="Preview"
      sentence="The instruction to be shown is handed in by the desk."
    />
  );
};
