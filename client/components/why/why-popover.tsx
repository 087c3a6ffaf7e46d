import { Popover } from 'radix-ui';
import { useId, useMemo, useRef, useState } from 'react';
import { useUnits } from '#client/lib/units.ts';
import { answer } from '#client/lib/why/answer.ts';
import type { WhyQuestion } from '#client/lib/why/question.ts';
import type { Asked, WhyPlace } from '#client/lib/why/why.ts';
import { WhyPanel } from './why-panel.tsx';

export interface WhyPopoverProps extends Omit<Asked, 'units'> {
  question: WhyQuestion;
  /** the pressed figure */
  figure: HTMLElement;
  onClose: () => void;
  hrefOf: (place: WhyPlace) => string | null;
  onFollow: (place: WhyPlace) => void;
}

/** The answer beside its figure; what went into it leads to its field, or is asked in turn. */
export function WhyPopover({ question, figure, plan, result, onClose, hrefOf, onFollow }: WhyPopoverProps) {
  const units = useUnits();
  const [trail, setTrail] = useState<readonly WhyQuestion[]>([question]);
  const asked = trail.at(-1) ?? question;
  const why = useMemo(() => answer(asked, { plan, result, units }), [asked, plan, result, units]);
  const anchor = useRef<HTMLElement>(figure);
  const content = useRef<HTMLDivElement>(null);
  const leaving = useRef(false);
  const id = useId();
  const step = (next: readonly WhyQuestion[]) => {
    setTrail(next);
    content.current?.focus();
  };
  return (
    <Popover.Root open onOpenChange={(open) => !open && onClose()}>
      <Popover.Anchor virtualRef={anchor} />
      <Popover.Portal container={document.getElementById('main')}>
        <Popover.Content
          ref={content}
          aria-labelledby={id}
          side="top"
          align="end"
          sideOffset={6}
          collisionPadding={8}
          onOpenAutoFocus={(event) => {
            event.preventDefault();
            content.current?.focus();
          }}
          onInteractOutside={(event) => {
            // Another figure is asked by its own press, and whatever is pressed takes the focus.
            leaving.current = true;
            if (event.target instanceof Node && figure.contains(event.target)) event.preventDefault();
          }}
          onCloseAutoFocus={(event) => {
            event.preventDefault();
            if (!leaving.current) figure.focus();
          }}
          className="no-print z-40 max-h-(--radix-popover-content-available-height) w-[min(32rem,calc(100vw-1rem))] overflow-y-auto rounded-md border border-strong-rule bg-sheet p-4 shadow-float"
        >
          <div className="mb-2 flex items-start justify-between gap-3">
            <h2 id={id} className="font-semibold">
              {why?.title ?? 'No figure any more'}
            </h2>
            <div className="-mt-1.5 -mr-1.5 flex shrink-0">
              {trail.length > 1 && (
                <button
                  type="button"
                  onClick={() => step(trail.slice(0, -1))}
                  className="min-h-row rounded-md px-2 text-note font-semibold text-ink hover:bg-ink-wash"
                >
                  Back
                </button>
              )}
              <Popover.Close
                aria-label="Close"
                className="grid size-row place-items-center rounded-md text-ink hover:bg-ink-wash"
              >
                <svg viewBox="0 0 12 12" width="11" height="11" aria-hidden="true">
                  <path d="M1 1 11 11M11 1 1 11" stroke="currentColor" strokeWidth="1.6" />
                </svg>
              </Popover.Close>
            </div>
          </div>
          {why ? (
            <WhyPanel
              why={why}
              hrefOf={hrefOf}
              onFollow={(place) => {
                leaving.current = true;
                onFollow(place);
              }}
              onAsk={(next) => step([...trail, next])}
            />
          ) : (
            <p className="text-note">The plan has changed; what was asked for is not in it.</p>
          )}
        </Popover.Content>
      </Popover.Portal>
    </Popover.Root>
  );
}
