import { useMemo, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { useUnits } from '#client/lib/units.ts';
import { fileName, saveFile } from '#client/lib/save-file.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import { PAPERS, type PaperName } from '#shared/drawing/paper/pages.ts';
import { svgFile } from '#shared/drawing/paper/svg-file.ts';
import type { Looking } from '../use-looking.ts';
import { drawingOf, pagesOf, whatChoices, type Subject, type What } from './outputs.ts';
import { PagePreview } from './page-preview.tsx';
import { PaperPages } from './paper-pages.tsx';

interface PrintDialogProps {
  plan: Plan;
  surface: Surface | null;
  /** where the section is taken, mm */
  station: number;
  /** what is looked at, to begin with */
  looking: Looking;
  /** mm aft of the datum */
  balance: number | null;
  onClose: () => void;
}

const PAPER_NAMES: readonly PaperName[] = ['a4', 'letter'];

/** Drawings at their true size: on pages to be joined, or as a file. */
export function PrintDialog({ plan, surface, station, looking, balance, onClose }: PrintDialogProps) {
  const units = useUnits();
  const side = surface?.mirrored ? looking.side : 'starboard';
  const subject = useMemo(
    (): Subject => ({ plan, surface, station, side, balance, units }),
    [plan, surface, station, side, balance, units],
  );
  const choices = whatChoices(subject);
  const [chosen, setChosen] = useState<What>(looking.view === 'half' ? side : looking.view);
  const [paper, setPaper] = useState<PaperName>(units.system === 'inch' ? 'letter' : 'a4');
  const say = useToast();
  const what = choices.some(({ value }) => value === chosen) ? chosen : (choices[0]?.value ?? 'whole');
  const pages = useMemo(() => pagesOf(what, subject, PAPERS[paper]), [what, subject, paper]);

  const save = async (kind: 'svg' | 'dxf') => {
    const drawing = drawingOf(what, subject);
    if (!drawing) return;
    const name = `${fileName(drawing.title)}.${kind}`;
    if (kind === 'svg') {
      saveFile(svgFile(drawing), 'image/svg+xml', name);
      return;
    }
    try {
      const { dxfFile } = await import('./dxf-file.ts');
      saveFile(dxfFile(drawing), 'image/vnd.dxf', name);
    } catch {
      say(
        'The DXF could not be made: its program could not be fetched. Look at the connection and try again.',
      );
    }
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title="Print to scale"
      description="True size, 1 : 1. Pages overlap by 10 mm and carry register marks; each has a line of 100 mm to check the printer by."
      wide
    >
      <div className="grid gap-x-6 gap-y-3 sm:grid-cols-[minmax(0,15rem)_minmax(0,1fr)]">
        <div className="grid content-start gap-y-2">
          <Select
            label="Drawing"
            value={what}
            options={choices}
            keepRoom={false}
            onValue={(next) => {
              const choice = choices.find(({ value }) => value === next);
              if (choice) setChosen(choice.value);
            }}
          />
          <Select
            label="Paper"
            value={paper}
            options={PAPER_NAMES.map((value) => ({ value, label: PAPERS[value].name }))}
            keepRoom={false}
            onValue={(next) => setPaper(next === 'letter' ? 'letter' : 'a4')}
          />
          <p role="status" className="text-note text-graphite">
            {pages ? pagesInWords(pages.pages.length, paper, pages.paper) : 'There is nothing to print.'}
          </p>
        </div>
        {pages && <PagePreview pages={pages} />}
      </div>
      <DialogActions>
        <Button disabled={!pages} onClick={() => void save('svg')}>
          Save SVG
        </Button>
        <Button disabled={!pages} onClick={() => void save('dxf')}>
          Save DXF
        </Button>
        <Button variant="primary" disabled={!pages} onClick={() => print()}>
          Print
        </Button>
      </DialogActions>
      {pages && <PaperPages pages={pages} />}
    </Dialog>
  );
}

function pagesInWords(count: number, paper: PaperName, { width, height }: { width: number; height: number }) {
  const way = width > height ? 'across' : 'upright';
  return `${count === 1 ? 'One page' : `${count} pages`} of ${PAPERS[paper].name}, ${way}.`;
}
