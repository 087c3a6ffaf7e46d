import { useMemo, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { TextArea, TextField } from '#client/components/ui/text-field.tsx';
import type { SectionSpec } from '#shared/core/plan.ts';
import { readSection, selfCrossingAt } from '#shared/core/section.ts';
import { contourOf } from '#shared/drawing/contour.ts';
import { boundsOf } from '#shared/drawing/shape.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import { layOnPaper, pathOf } from '#client/components/drawing/sheet.ts';
import { parsePoints, pointsText } from './section-text.ts';

interface PointsDialogProps {
  title: string;
  /** the section as it is; its own points are what the dialog opens with */
  spec: SectionSpec;
  onSpec: (spec: SectionSpec) => void;
  onClose: () => void;
}

/** Pastes a section's own coordinates and shows them before they are taken. */
export function PointsDialog({ title, spec, onSpec, onClose }: PointsDialogProps) {
  const before = 'points' in spec ? spec : null;
  const [name, setName] = useState(before?.name ?? 'Own section');
  const [text, setText] = useState(before ? pointsText(before) : '');
  const [asked, setAsked] = useState(false);
  const parsed = useMemo(() => parsePoints(text), [text]);
  const points = 'value' in parsed ? parsed.value : null;
  const problem = 'problem' in parsed && (asked || text.trim() !== '') ? parsed.problem : undefined;
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={title}
      description="One point to a line, x and z of the chord (0 to 1) or in per cent: from the trailing edge over the top to the nose, and back along the underside."
    >
      <form
        className="grid gap-y-1"
        onSubmit={(event) => {
          event.preventDefault();
          setAsked(true);
          if (points && name.trim() !== '') onSpec({ name: name.trim(), points });
        }}
      >
        <TextField
          label="Name"
          value={name}
          maxLength={120}
          error={asked && name.trim() === '' ? 'Give it a name.' : undefined}
          onChange={(event) => setName(event.target.value)}
        />
        <TextArea
          label="Points"
          rows={9}
          spellCheck={false}
          value={text}
          error={problem}
          onChange={(event) => setText(event.target.value)}
        />
        {points && <Preview points={points} />}
        <DialogActions>
          <Button onClick={onClose}>Cancel</Button>
          <Button type="submit" variant="primary">
            Use these points
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

const WIDTH = 420;

function Preview({ points }: { points: [number, number][] }) {
  const section = readSection({ name: '', points }, 1);
  const shape = { points: contourOf({ section, chord: 1 }) };
  const bounds = boundsOf([shape]);
  const crossing = selfCrossingAt(section);
  if (!bounds) return null;
  const { sheet, height } = layOnPaper(bounds, {
    axes: 'elevation',
    width: WIDTH,
    margins: { top: 6, right: 6, bottom: 6, left: 6 },
    maxHeight: 120,
    minHeight: 40,
  });
  return (
    <>
      <svg viewBox={`0 0 ${WIDTH} ${height}`} aria-hidden="true" className="w-full">
        <path d={pathOf(sheet, shape.points, true)} fill="var(--wood-light)" stroke="var(--pencil)" />
      </svg>
      <p role="status" className={crossing === null ? 'text-note text-graphite' : 'text-note text-red'}>
        {crossing === null
          ? `${points.length} points read.`
          : `▲ The two faces cross at ${formatQuantity(crossing, 'share')} of the chord.`}
      </p>
    </>
  );
}
