import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import { firstFlightInput, type FirstFlightDto } from '#shared/schemas/first-flight.ts';
import { formatNumber } from '#shared/format/numbers.ts';
import { GLIDES } from './glide-advice.ts';
import { Step } from './step.tsx';
import type { FieldFacts } from './use-flight.ts';

interface RecordsProps {
  facts: Pick<FieldFacts, 'box' | 'waiting' | 'signed'>;
  canSign: boolean;
  /** lets the next record follow this one */
  onFollow: (id: string | null) => void;
  followed: string | null;
}

/** What was signed before, the newest first, and what still waits on this device. */
export function Records({ facts, canSign, onFollow, followed }: RecordsProps) {
  const { box, waiting, signed } = facts;
  const here = waiting.flatMap((record) => {
    const parsed = firstFlightInput.safeParse(record.body);
    return record.kind === 'first-flight' && parsed.success && !signed?.some(({ id }) => id === record.key)
      ? [{ record, body: parsed.data }]
      : [];
  });
  const count = (signed?.length ?? 0) + here.length;
  return (
    <Step title="Signed" state={count === 0 ? '' : String(count)}>
      {signed === null && (
        <p className="mt-1 text-graphite">What was signed before cannot be fetched just now.</p>
      )}
      {signed !== null && count === 0 && <p className="mt-1 text-graphite">No record is signed yet.</p>}
      {here.map(({ record, body }) => (
        <Notice
          key={record.key}
          tone={record.refused === null ? 'ochre' : 'red'}
          word={record.refused === null ? 'On this device:' : 'Not taken:'}
          className="mt-2"
          actions={
            record.refused !== null && (
              <Button
                variant="danger"
                onClick={() => {
                  box.drop(record.key);
                  if (followed === record.key) onFollow(body.follows);
                }}
              >
                Throw it away
              </Button>
            )
          }
        >
          signed by {body.signature}, {formatMoment(body.signedAt)}.{' '}
          {record.refused ?? 'It goes by itself when the server can be reached.'}
        </Notice>
      ))}
      <ul>
        {signed?.map((one) => (
          <li key={one.id} className="border-b border-rule py-2">
            <Signed one={one} all={signed} />
            {canSign && followed !== one.id && (
              <Button variant="plain" className="min-h-11" onClick={() => onFollow(one.id)}>
                Let the next follow No. {one.number}
              </Button>
            )}
            {canSign && followed === one.id && (
              <p className="text-note text-graphite">The next record follows this one.</p>
            )}
          </li>
        ))}
      </ul>
    </Step>
  );
}

function Signed({ one, all }: { one: FirstFlightDto; all: readonly FirstFlightDto[] }) {
  const units = useUnits();
  const { flown, range, ballast, checks, glides } = one;
  const before = all.find(({ id }) => id === one.follows);
  const apart = one.follows === null && all.some(({ number }) => number < one.number);
  const no = checks.filter(({ answer }) => answer === 'no');
  const percent = flown.percentMac === null ? '' : `, ${formatNumber(flown.percentMac, 1)} % MAC`;
  return (
    <details>
      <summary className="opens min-h-11 py-2">
        <strong className="font-semibold">No. {one.number}</strong>, {formatMoment(one.signedAt)},{' '}
        {one.signature}
        <span className="block">
          {units.format(flown.mass, 'mass')}, balances at {units.format(flown.x, 'length')}
          {percent}
        </span>
      </summary>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 py-2">
        <Fact name="Range">
          {units.format(range.from, 'length', { bare: true })}–{units.format(range.to, 'length')}
        </Fact>
        <Fact name="Ballast">
          {ballast.length === 0
            ? 'none fitted after weighing'
            : ballast
                .map(
                  ({ name, mass, x }) =>
                    `${name}, ${units.format(mass, 'mass')} at ${units.format(x, 'length')}`,
                )
                .join('; ')}
        </Fact>
        <Fact name="Field">
          {one.place || '–'}
          {one.wind !== null && `, wind ${units.format(one.wind, 'speed')}`}
        </Fact>
        <Fact name="Check">
          {no.length === 0
            ? `${checks.length} answered, nothing against`
            : no.map(({ words, note }) => `No: ${words} ${note}`).join(' ')}
        </Fact>
        <Fact name="Glides">
          {glides.length === 0
            ? 'none noted'
            : glides
                .map(({ behaviour, note }) => `${GLIDES[behaviour].label}${note ? ` (${note})` : ''}`)
                .join('; ')}
        </Fact>
        {one.note && <Fact name="Notes">{one.note}</Fact>}
        <Fact name="Kept">
          by {one.signedBy}, {formatMoment(one.receivedAt)}
          {before && `; follows No. ${before.number}`}
          {apart && '; follows none: it was begun without knowing of the earlier ones'}
        </Fact>
      </dl>
    </details>
  );
}

function Fact({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <>
      <dt className="text-graphite">{name}</dt>
      <dd>{children}</dd>
    </>
  );
}
