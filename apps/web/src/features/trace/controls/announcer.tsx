import { createContext, useCallback, useContext, useState, type ReactNode } from 'react';
import { VisuallyHidden } from '../../../ui/visually-hidden';

const AnnounceContext = createContext<(text: string) => void>(() => undefined);

/** Says aloud what just changed, for those who do not see it. */
export function Announcer({ children }: { children: ReactNode }) {
  const [said, setSaid] = useState({ text: '', turn: 0 });
  const announce = useCallback(
    (text: string) => setSaid(({ turn }) => ({ text, turn: turn + 1 })),
    [],
  );
  return (
    <AnnounceContext value={announce}>
      {children}
      <VisuallyHidden role="status" aria-live="polite">
        {/* A new node for each turn, so that the same words are said again. */}
        <span key={said.turn}>{said.text}</span>
      </VisuallyHidden>
    </AnnounceContext>
  );
}

export function useAnnounce(): (text: string) => void {
  return useContext(AnnounceContext);
}
