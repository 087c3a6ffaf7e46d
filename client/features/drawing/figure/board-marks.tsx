import { useUnits } from '#client/lib/units.ts';
import type { Surface } from '#shared/core/plan.ts';
import { stationAt, surfaceLine } from '#shared/core/stations.ts';
import { macMark, ribNumbers } from '#shared/drawing/marks.ts';
import { tipLength } from '#shared/drawing/outline.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { SheetText } from '#client/components/drawing/sheet-text.tsx';
import { toPx, type Sheet } from '#client/components/drawing/sheet.ts';

interface BoardMarksProps {
  surface: Surface;
  side: SideName;
  sheet: Sheet;
  /** px at which the dimension line runs; null for none */
  dimensionAt: number | null;
  /** stations are cut here, mm; null without a section */
  station: number | null;
  brief: boolean;
}

/** Least distance of two rib numbers, px. */
const NUMBERS_APART = 16;

/** What is written round a half laid flat: rib numbers, panel spans, the mean chord, and where it is cut. */
export function BoardMarks({ surface, side, sheet, dimensionAt, station, brief }: BoardMarksProps) {
  const line = surfaceLine(surface);
  const sign = side === 'port' ? -1 : 1;
  const px = (x: number, s: number) => toPx(sheet, [x, sign * s]);
  const at = (s: number) => stationAt(line, s);
  const trailing = (s: number) => px(at(s).leadingEdge + at(s).chord, s);
  const mac = macMark(surface);
  const numbers = ribNumbers(surface);
  return (
    <g pointerEvents="none">
      <MacLine mac={mac} px={px} brief={brief} cutX={station === null ? null : px(0, station)[0]} />
      {dimensionAt !== null && (
        <Spans surface={surface} tip={tipLength(surface, side)} px={px} y={dimensionAt} />
      )}
      {station !== null && <Cut from={px(at(station).leadingEdge, station)} to={trailing(station)} />}
      {thinned(numbers, sheet.scale).map(({ s, number }) => {
        const [x, y] = trailing(s);
        return (
          <SheetText key={s} x={x} y={y + 14} textAnchor="middle">
            {number}
          </SheetText>
        );
      })}
    </g>
  );
}

/** Rib numbers as far apart as they can be read; the first always stands. */
function thinned(stations: readonly number[], scale: number): { s: number; number: number }[] {
  let last = -Infinity;
  return stations.flatMap((s, i) => {
    if ((s - last) * scale < NUMBERS_APART) return [];
    last = s;
    return [{ s, number: i + 1 }];
  });
}

type Px = (x: number, s: number) => readonly [number, number];

interface MacLineProps {
  mac: ReturnType<typeof macMark>;
  px: Px;
  brief: boolean;
  /** px of the cutting plane, whose arrow the words must leave alone */
  cutX: number | null;
}

/** Width of the words, px. */
const MAC_WORDS = 80;

function MacLine({ mac, px, brief, cutX }: MacLineProps) {
  const units = useUnits();
  const [x, y0] = px(mac.x, mac.s);
  const [, y1] = px(mac.x + mac.length, mac.s);
  const leftward = cutX !== null && cutX > x && cutX < x + MAC_WORDS;
  return (
    <>
      <path
        d={`M${x} ${y0 - (brief ? 0 : 8)}V${y1}`}
        stroke="var(--graphite)"
        strokeWidth={1.2}
        strokeDasharray="6 4"
      />
      <path d={`M${x - 4} ${y0}h8M${x - 4} ${y1}h8`} stroke="var(--graphite)" strokeWidth={1.2} />
      <SheetText
        x={leftward ? x - 5 : x + 5}
        y={y0 - (brief ? 4 : 6)}
        textAnchor={leftward ? 'end' : 'start'}
      >
        MAC {units.format(mac.length, 'length', { bare: true })}
      </SheetText>
    </>
  );
}

/** One dimension line for the panels, root to tip, and the tip block. */
function Spans({ surface, tip, px, y }: { surface: Surface; tip: number; px: Px; y: number }) {
  const units = useUnits();
  const lengths = [...surface.panels.map((panel) => panel.span), ...(tip > 0 ? [tip] : [])];
  let from = 0;
  return lengths.map((length, i) => {
    const [a] = px(0, from);
    from += length;
    const [b] = px(0, from);
    const text = units.size(length, { bare: true });
    return (
      <g key={i}>
        <path
          d={`M${a} ${y - 5}v10M${b} ${y - 5}v10M${a} ${y}H${b}`}
          stroke="var(--graphite)"
          strokeWidth={1}
        />
        <SheetText x={(a + b) / 2} y={y + (Math.abs(b - a) < 34 ? 18 : 16)} textAnchor="middle">
          {text}
        </SheetText>
      </g>
    );
  });
}

/** Where the section is taken: the cutting plane's two strokes with their arrows. */
function Cut({
  from: [x, y0],
  to: [, y1],
}: {
  from: readonly [number, number];
  to: readonly [number, number];
}) {
  return (
    <g stroke="var(--ink)" fill="var(--ink)">
      <path d={`M${x} ${y0}V${y1}`} strokeWidth={1} strokeDasharray="8 3 2 3" />
      <path d={`M${x} ${y0 - 14}V${y0 - 3}M${x} ${y1 + 18}V${y1 + 28}`} strokeWidth={2.2} />
      <path d={`M${x} ${y0 - 14}h-8m0 -3v6l-5 -3zM${x} ${y1 + 28}h-8m0 -3v6l-5 -3z`} strokeWidth={1} />
    </g>
  );
}
