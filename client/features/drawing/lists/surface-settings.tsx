import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import type { Surface, SurfaceRole } from '#shared/core/plan.ts';
import { changeSurface } from '../edits/plan-edits.ts';
import { Fold } from '../fold.tsx';
import { ChoiceOf, TextOf, TickOf } from '../forms/choice-of.tsx';
import type { Form } from '../forms/form.ts';
import { PlaceOf } from '../forms/several-of.tsx';
import type { Desk } from './rows-pane.tsx';

export const ROLES: readonly { value: SurfaceRole; label: string }[] = [
  { value: 'wing', label: 'Wing' },
  { value: 'tailplane', label: 'Tailplane' },
  { value: 'fin', label: 'Fin' },
];

interface SurfaceSettingsProps {
  desk: Desk;
  surface: Surface;
  index: number;
  onRemoved: () => void;
}

/** Name, role and place of a surface, and its removal. */
export function SurfaceSettings({ desk, surface, index, onRemoved }: SurfaceSettingsProps) {
  const [open, setOpen] = useState(false);
  const form: Form<Surface> = {
    value: surface,
    set: (changes, field) =>
      desk.edit(
        changeSurface(index, (s) => ({ ...s, ...changes })),
        `surface ${index}: ${field}`,
      ),
    issue: (path) => desk.issues.get(`surfaces/${index}/${path}`),
    readOnly: !desk.canEdit,
  };
  const remove = () => {
    desk.pick(null);
    desk.edit(
      (plan) => ({ ...plan, surfaces: plan.surfaces.filter((_, i) => i !== index) }),
      `remove surface ${surface.key}`,
    );
    onRemoved();
  };
  const wrong = [...desk.issues.keys()].some((path) => /^surfaces\/\d+\/(key|role|apex|mirrored)/.test(path));
  return (
    <Fold
      summary={`Name and place of the ${surface.key}`}
      open={open || wrong}
      onToggle={(event) => setOpen(event.currentTarget.open)}
      className="border-t border-rule px-2 pt-1"
    >
      <div className="grid grid-cols-1 gap-y-1.5 pt-1">
        <TextOf form={form} field="key" label="Name" />
        <ChoiceOf form={form} field="role" label="Role" options={ROLES} />
        <PlaceOf form={form} field="apex" label="Root leading edge x, y, z" />
        <TickOf form={form} field="mirrored" label="Two halves, port and starboard" />
        {desk.canEdit && (
          <div className="pt-1">
            <Button variant="danger" onClick={remove}>
              Remove the {surface.key}
            </Button>
          </div>
        )}
      </div>
    </Fold>
  );
}
