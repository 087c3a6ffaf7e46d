import { useEffect, useRef, type ReactNode } from 'react';

interface PhonePanelProps {
  id: string;
  title: string;
  onClose: () => void;
  children: ReactNode;
}

/** A form as a panel of its own at the foot of a small screen, the drawing in sight above it. */
export function PhonePanel({ id, title, onClose, children }: PhonePanelProps) {
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus({ preventScroll: true }), []);
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.key === 'Escape') onClose();
    };
    addEventListener('keydown', onKeyDown);
    return () => removeEventListener('keydown', onKeyDown);
  }, [onClose]);
  return (
    <section
      id={id}
      data-form=""
      aria-label={title}
      className="fixed inset-x-0 bottom-0 z-30 flex max-h-[58dvh] flex-col border-t-2 border-ink bg-sheet shadow-float"
    >
      <div className="flex items-center justify-between gap-3 border-b border-rule pl-4">
        <h3 ref={heading} tabIndex={-1} className="min-w-0 truncate font-semibold">
          {title}
        </h3>
        <button type="button" onClick={onClose} className="min-h-11 shrink-0 px-4 font-semibold text-ink">
          Done
        </button>
      </div>
      <div className="min-h-0 overflow-y-auto px-4 py-3 pb-[max(0.75rem,env(safe-area-inset-bottom))]">
        {children}
      </div>
    </section>
  );
}
