import { Button } from '#client/components/ui/button.tsx';
import { Dialog, DialogActions } from '#client/components/ui/dialog.tsx';
import type { ChosenUnits } from '#shared/format/units.ts';
import { NumberRules } from './number-rules.tsx';
import { UnitsForm } from './units-form.tsx';

interface UnitsDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  units: ChosenUnits;
  onUnits: (units: ChosenUnits) => void;
}

/** Units of every figure, and how numbers are typed; for visitors too. */
export function UnitsDialog({ open, onOpenChange, units, onUnits }: UnitsDialogProps) {
  return (
    <Dialog
      wide
      open={open}
      onOpenChange={onOpenChange}
      title="Units and numbers"
      description="A choice shows at once, on every page, in print and in files."
    >
      <UnitsForm units={units} onUnits={onUnits} />
      <div className="mt-6">
        <NumberRules />
      </div>
      <DialogActions>
        <Button variant="primary" onClick={() => onOpenChange(false)}>
          Done
        </Button>
      </DialogActions>
    </Dialog>
  );
}
