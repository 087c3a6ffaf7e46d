import { Notice } from '#client/components/ui/notice.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { SparBend } from '#shared/core/deflection.ts';
import { loadFactorText } from './words.ts';

/** A tip that rises more than this share of the half span is past what small angles hold for. */
const LARGE = 0.15;

interface CautionsProps {
  /** m/s */
  stall: number | null;
  bend: SparBend | null;
  /** of the tip, in the case that is drawn, mm */
  rise: number | null;
  /** tip to tip, mm */
  span: number;
}

/** What the figures are, and what they are not. They stand beside the figures always. */
export function Cautions({ stall, bend, rise, span }: CautionsProps) {
  const units = useUnits();
  return (
    <>
      <Notice tone="ochre" word="An estimate from averages:">
        grain, knots and glue decide. No licence to launch hard.
      </Notice>
      <details className="-mt-2">
        <summary className="opens text-note font-semibold">How it is reckoned</summary>
        <ul className="ml-4 grid list-disc gap-y-1 text-note text-graphite">
          <li>
            Lift along the span by O. Schrenk (NACA TM 948): halfway between the real chord and an ellipse. It
            bends the wing with the mass of everything but the wing; the wing’s own mass is taken to hang
            where it is lifted, and so is left out.
          </li>
          <li>
            The strips at top and bottom carry together, each by its stiffness, about their common axis.
            Margin is the strength of the strip over the stress in its outer fibre. Webs, sheeting, joints,
            joiners and buckling are not looked at.
          </li>
          <li>
            For a speed V the load factor is (V ÷ V<sub>stall</sub>)², the most that the wing can lift before
            it stalls; it stalls at {units.format(stall, 'speed')} in the plan’s air. A gust or a line can ask
            for less, not for more. A launch by the wing tip loads it otherwise.
          </li>
          <li>
            {bend === null
              ? 'The rise of the tip is told where the strips run on from the root without a gap.'
              : `The tip’s rise is that of a beam clamped at the root; glue and joints give more. ${
                  rise !== null && span > 0 && rise > (LARGE * span) / 2
                    ? `At ${loadFactorText(rise / bend.tip)} it is so large that the true one is less.`
                    : ''
                }`}
          </li>
        </ul>
      </details>
    </>
  );
}
