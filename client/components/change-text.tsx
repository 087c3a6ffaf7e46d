import { changesInWords, type ToldChange } from '#client/lib/change-words.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';

interface ChangeTextProps {
  changes: readonly ToldChange[];
  /** to name woods by */
  materials: Plan['materials'];
  /** things told at most */
  most?: number;
  /** changes that are not in the list */
  more?: number;
  /** without the name, where it stands before already */
  bare?: boolean;
}

/** Changes in words in one line: what was changed stands out, what became of it follows. */
export function ChangeText(props: ChangeTextProps) {
  const { changes, materials, most = Infinity, more = 0, bare = false } = props;
  const words = changesInWords(changes, materials, useUnits());
  const rest = more + Math.max(0, words.length - most);
  return (
    <>
      {words.slice(0, most).map(({ name, text }, i) => (
        <span key={`${name} ${text}`}>
          {i > 0 && '; '}
          {!bare && <b className="font-semibold">{name}</b>} {text}
        </span>
      ))}
      {rest > 0 && `; and ${rest} more`}
    </>
  );
}
