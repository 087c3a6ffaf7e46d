import { createContext, useCallback, useContext, useMemo, useRef, useState, type ReactNode } from 'react';

interface Message {
  id: number;
  text: string;
}

const ToastContext = createContext<(text: string) => void>(() => undefined);

/** Says something briefly, without taking the focus. */
export function useToast(): (text: string) => void {
  return useContext(ToastContext);
}

/** How long a message stays, ms: long enough to be read slowly. */
const STAYS = 6000;

export function ToastProvider({ children }: { children: ReactNode }) {
  const [messages, setMessages] = useState<Message[]>([]);
  const next = useRef(1);
  const drop = useCallback((id: number) => setMessages((all) => all.filter((m) => m.id !== id)), []);
  const say = useCallback(
    (text: string) => {
      const id = next.current++;
      setMessages((all) => [...all.slice(-2), { id, text }]);
      setTimeout(() => drop(id), STAYS);
    },
    [drop],
  );
  const value = useMemo(() => say, [say]);

  return (
    <ToastContext value={value}>
      {children}
      <div
        role="status"
        aria-live="polite"
        className="no-print pointer-events-none fixed inset-x-4 bottom-20 z-50 flex flex-col items-center gap-2 sm:bottom-6 sm:items-start sm:left-7"
      >
        {messages.map((message) => (
          <div
            key={message.id}
            className="pointer-events-auto flex max-w-md items-center gap-3 rounded-md bg-pencil forced-color-adjust-none py-1.5 pr-1.5 pl-4 text-sheet shadow-float"
          >
            <span>{message.text}</span>
            <button
              type="button"
              aria-label="Dismiss"
              onClick={() => drop(message.id)}
              className="grid size-8 shrink-0 place-items-center rounded-md hover:bg-graphite"
            >
              ✕
            </button>
          </div>
        ))}
      </div>
    </ToastContext>
  );
}
