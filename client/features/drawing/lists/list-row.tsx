import { memo, useEffect, useId, useRef, type ReactNode, type RefObject } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import { cn } from '#client/lib/cn.ts';
import { useIsHovered, type Hover } from '../hover.ts';
import { FormBox } from './form-box.tsx';
import { PhonePanel } from './phone-panel.tsx';
import { RowTools, type RowOps } from './row-tools.tsx';

interface ListRowProps {
  rowRef?: RefObject<HTMLLIElement | null> | undefined;
  id: string;
  /** id of its line on the balance sheet */
  line: string;
  name: string;
  note: string;
  size: string;
  /** g; undefined while the plan is not valid and the line is not in the estimate yet */
  mass: number | undefined;
  picked: boolean;
  first: boolean;
  last: boolean;
  hover: Hover;
  ops: RowOps;
  narrow: boolean;
  canEdit: boolean;
  /** something in it is refused */
  wrong: boolean;
  /** its form, while it is picked */
  form: ReactNode;
}

/** One part, solid or item in its list; its form opens under it, or on the phone in a panel of its own. */
export const ListRow = memo(function ListRow(props: ListRowProps) {
  const { id, line, name, note, size, mass, picked, hover, ops, narrow, wrong, form } = props;
  const hovered = useIsHovered(hover, line);
  const formId = useId();
  const ownRef = useRef<HTMLLIElement>(null);
  const row = props.rowRef ?? ownRef;
  useEffect(() => {
    if (picked && !narrow) row.current?.scrollIntoView({ block: 'nearest' });
  }, [picked, narrow, row]);
  const tools = props.canEdit && <RowTools {...{ id, name, ops }} first={props.first} last={props.last} />;

  return (
    <li
      ref={row}
      data-line={line}
      onPointerEnter={() => hover.set(line)}
      onPointerLeave={() => hover.set(null)}
      className="scroll-my-3 [contain-intrinsic-size:auto_var(--row)] [content-visibility:auto]"
    >
      <button
        type="button"
        data-row=""
        aria-expanded={picked}
        aria-controls={picked ? formId : undefined}
        onClick={() => ops.pick(picked ? null : line)}
        className={cn(
          'flex min-h-row w-full items-baseline gap-x-2 border-b border-rule px-2 py-1.5 text-left focus-visible:-outline-offset-2',
          picked ? 'bg-ink-wash font-semibold' : hovered && 'bg-ink-wash',
        )}
      >
        <span className="min-w-0 flex-1">
          {wrong && (
            <span className="text-red">
              <span aria-hidden="true">▲ </span>
              <span className="sr-only">not valid: </span>
            </span>
          )}
          {name === '' ? <span className="text-graphite">no name</span> : name}
          {note !== '' && <span className="text-note font-normal text-graphite"> {note}</span>}
        </span>
        <span className="shrink-0 font-normal">{size}</span>
        <Amount value={mass} quantity="mass" className="w-18 shrink-0 text-right" />
      </button>
      {picked &&
        (narrow ? (
          <PhonePanel id={formId} title={name} onClose={() => ops.close(line)}>
            {form}
            {tools}
          </PhonePanel>
        ) : (
          <FormBox id={formId} onClose={() => ops.close(line)}>
            {form}
            {tools}
          </FormBox>
        ))}
    </li>
  );
});
