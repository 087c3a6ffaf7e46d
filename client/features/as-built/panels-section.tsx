import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { matchPanels } from '#shared/core/built/panel-match.ts';
import type { Plan, Surface } from '#shared/core/plan.ts';
import { surfaceLine } from '#shared/core/stations.ts';
import type { Built } from '#client/lib/built/use-built.ts';
import { matchWords } from './words.ts';

/** Sanding that is offered: the parts that have to give least. */
const OFFERED = 3;

/** Port and starboard of each surface against each other. */
export function PanelsSection({ built, plan }: { built: Built; plan: Plan }) {
  const halves = plan.surfaces.filter(({ mirrored }) => mirrored);
  if (halves.length === 0) return null;
  return (
    <section aria-label="Port and starboard" className="mt-10 border-t border-rule pt-6">
      <h2 className="text-heading font-semibold">Port and starboard</h2>
      {halves.map((surface) => (
        <Halves key={surface.key} built={built} surface={surface} />
      ))}
    </section>
  );
}

function Halves({ built, surface }: { built: Built; surface: Surface }) {
  const units = useUnits();
  const { account, counted } = built;
  const own = account.parts.filter((part) => part.surface === surface.key && part.side !== 'middle');
  const weighed = own.filter(({ weighing }) => weighing !== null);
  const name = surface.key.charAt(0).toUpperCase() + surface.key.slice(1);
  if (weighed.length === 0) {
    return (
      <p className="mt-2 text-graphite">
        <span className="font-semibold text-pencil">{name}:</span> nothing of it is weighed yet, so both
        halves are as drawn.
      </p>
    );
  }
  const uOf = (side: 'port' | 'starboard') => {
    const ids = new Set(weighed.filter((part) => part.side === side).map(({ weighing }) => weighing));
    return Math.hypot(...counted.filter(({ id }) => ids.has(id)).map(({ u }) => u));
  };
  const line = surfaceLine(surface);
  const outermost = line.panels.at(-1);
  const tip = outermost ? outermost.y + (outermost.end - outermost.start) * outermost.cos : 0;
  const root = surface.apex[1];
  const match = matchPanels(own, { root, tip, uOf: { port: uOf('port'), starboard: uOf('starboard') } });
  const isWhole = weighed.length === own.length;
  const rows = [
    ['Mass', 'mass', match.port.mass, match.starboard.mass],
    ['About the root', 'moment', match.port.aboutRoot, match.starboard.aboutRoot],
    ['About the roll axis', 'moment', match.port.aboutRoll, match.starboard.aboutRoll],
  ] as const;
  return (
    <div className="mt-3">
      <p>
        <span className="font-semibold">{name}:</span> {matchWords(match, units)}
        {!isWhole && ` ${weighed.length} of ${own.length} parts are weighed; the rest counts as forecast.`}
      </p>
      <Table caption={`Halves of the ${surface.key}`} className="mt-1 max-w-2xl">
        <thead>
          <tr>
            <Th>
              <span className="sr-only">What</span>
            </Th>
            <Th numeric>Port</Th>
            <Th numeric>Starboard</Th>
            <Th numeric>Apart</Th>
          </tr>
        </thead>
        <tbody>
          {rows.map(([label, quantity, port, starboard]) => (
            <Tr key={label}>
              <RowTh>{label}</RowTh>
              <Td numeric>{units.format(port, quantity)}</Td>
              <Td numeric>{units.format(starboard, quantity)}</Td>
              <Td numeric>{units.format(Math.abs(port - starboard), quantity)}</Td>
            </Tr>
          ))}
        </tbody>
      </Table>
      {!match.matched && match.sanding.length > 0 && (
        <p className="mt-1 text-note text-graphite">
          Sanding would do instead:{' '}
          {match.sanding
            .slice(0, OFFERED)
            .map(
              ({ name: part, takeOff, share }) =>
                `${units.format(takeOff, 'mass')} off ${part} (${units.format(share, 'share')} of it)`,
            )
            .join(', or ')}
          . Wear a mask for the dust.
        </p>
      )}
    </div>
  );
}
