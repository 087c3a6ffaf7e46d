import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import { GUIDED_BOUNDS, type GuidedProblem } from '#shared/plan-start/guided-wishes.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { keptWishes, type KeptWishes } from './wishes.ts';
import { DIHEDRALS, hintOf, problemOf, STRUCTURES, TAILS } from './words.ts';

interface GuidedFormProps {
  wishes: KeptWishes;
  problems: readonly GuidedProblem[];
  onWishes: (wishes: KeptWishes) => void;
}

/** The wishes, in the order in which a model is thought up. */
export function GuidedForm({ wishes, problems, onWishes }: GuidedFormProps) {
  const units = useUnits();
  const { structure, dihedral, tail } = keptWishes.shape;
  const set = (changes: Partial<KeptWishes>) => onWishes({ ...wishes, ...changes });
  const problem = (field: GuidedProblem['field']) => problemOf(problems, field, units);
  const length = (field: 'span' | 'rootChord' | 'tipChord', label: string) => {
    const { min, max } = field === 'span' ? GUIDED_BOUNDS.span : GUIDED_BOUNDS.chord;
    return (
      <NumberField
        label={label}
        quantity="length"
        value={wishes[field]}
        min={min}
        max={max}
        step={field === 'span' ? 10 : undefined}
        error={wishes[field] === null ? undefined : problem(field)}
        onChange={(value) => set({ [field]: value })}
      />
    );
  };
  return (
    <div className="grid gap-x-5 gap-y-1 sm:grid-cols-2">
      <div className="sm:col-span-2">
        <TextField
          label="Name"
          value={wishes.name}
          placeholder="New glider"
          maxLength={LIMITS.name.max}
          onChange={(event) => set({ name: event.target.value })}
        />
      </div>
      {length('span', 'Wing span')}
      <div className="max-sm:hidden" />
      {length('rootChord', 'Root chord')}
      {length('tipChord', 'Tip chord')}
      <div className="sm:col-span-2">
        <Select
          label="Wing built of"
          options={STRUCTURES}
          value={wishes.structure}
          hint={hintOf(STRUCTURES, wishes.structure)}
          error={problem('structure')}
          onValue={(value) => set({ structure: structure.parse(value) })}
        />
      </div>
      {wishes.structure !== 'sheet' && (
        <TextField
          label="Section, four digits"
          value={wishes.section}
          inputMode="numeric"
          maxLength={4}
          error={problem('section')}
          onChange={(event) => set({ section: event.target.value.trim() })}
        />
      )}
      <Select
        label="Dihedral"
        options={DIHEDRALS}
        value={wishes.dihedral}
        hint={hintOf(DIHEDRALS, wishes.dihedral)}
        onValue={(value) => set({ dihedral: dihedral.parse(value) })}
      />
      <div className="sm:col-span-2">
        <Select
          label="Tail"
          options={TAILS}
          value={wishes.tail}
          hint={hintOf(TAILS, wishes.tail)}
          onValue={(value) => set({ tail: tail.parse(value) })}
        />
        <Checkbox
          label="Radio gear for rudder and elevator"
          hint="receiver, two servos and a battery, 29 g"
          checked={wishes.radio}
          onValue={(radio) => set({ radio })}
        />
      </div>
    </div>
  );
}
