import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import type { Assignment } from './use-assignment.ts';

/** Longest that a search may take, s. */
export const MOST_SECONDS = 120;

const AIMS = [
  { value: 'lightest', label: 'Lightest' },
  { value: 'matched', label: 'Halves matched best' },
  { value: 'strongest', label: 'Strongest spars' },
] as const;

interface AssignTermsProps {
  assignment: Assignment;
  seconds: number;
  onSeconds: (seconds: number) => void;
}

/** What the search is after, and what it keeps to. */
export function AssignTermFields({ assignment, seconds, onSeconds }: AssignTermsProps) {
  const { terms, setTerms } = assignment;
  return (
    <div className="grid max-w-5xl grid-cols-1 gap-x-6 sm:grid-cols-2 lg:grid-cols-5">
      <Select
        label="Best is"
        value={terms.aim}
        options={AIMS}
        onValue={(value) => {
          const aim = AIMS.find((each) => each.value === value)?.value;
          if (aim) setTerms({ aim, gap: null, note: '' });
        }}
      />
      <NumberField
        label="A cut takes"
        quantity="length"
        value={terms.kerf}
        min={0}
        max={10}
        onChange={(kerf) => kerf !== null && setTerms({ kerf, gap: null })}
      />
      <NumberField
        label="Halves apart by at most"
        quantity="mass"
        value={terms.massTolerance}
        min={0}
        max={1000}
        optional
        onChange={(massTolerance, problem) => {
          if (problem === null || problem === 'missing') setTerms({ massTolerance, gap: null });
        }}
      />
      <NumberField
        label="and about the middle by"
        quantity="moment"
        value={terms.momentTolerance}
        min={0}
        max={1e6}
        optional
        onChange={(momentTolerance, problem) => {
          if (problem === null || problem === 'missing') setTerms({ momentTolerance, gap: null });
        }}
      />
      <NumberField
        label="Search at most"
        quantity="count"
        suffix="s"
        value={seconds}
        min={1}
        max={MOST_SECONDS}
        step={5}
        onChange={(value) => value !== null && value >= 1 && value <= MOST_SECONDS && onSeconds(value)}
      />
    </div>
  );
}
