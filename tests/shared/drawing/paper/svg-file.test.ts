import { describe, expect, it } from 'vitest';
import { svgFile } from '#shared/drawing/paper/svg-file.ts';
import type { TrueDrawing } from '#shared/drawing/paper/true-size.ts';

const drawing: TrueDrawing = {
  title: 'Rib <3> & "spar"\u0007',
  width: 150.128,
  height: 20,
  strokes: [
    {
      points: [
        [4, 4],
        [146.128, 4.004],
        [146.128, 16],
      ],
      closed: true,
      pen: 'cut',
    },
    {
      points: [
        [0, 0],
        [10, 0],
      ],
      closed: false,
      pen: 'hidden',
    },
  ],
  letters: [{ at: [5, 18], text: '1/16 in', size: 3, anchor: 'start' }],
};

describe('an SVG file', () => {
  const svg = svgFile(drawing);

  it('is of its true size in millimetres, one unit each', () => {
    expect(svg).toContain('width="150.13mm" height="20mm" viewBox="0 0 150.13 20"');
    expect(svg).toContain('<path d="M4 4L146.13 4L146.13 16Z"/>');
  });

  it('has a title, with what XML cannot hold written another way or left out', () => {
    expect(svg).toContain('<title>Rib &lt;3&gt; &amp; &quot;spar&quot;</title>');
  });

  it('keeps what is hidden dashed and apart', () => {
    expect(svg).toMatch(/<g id="hidden" stroke-width="0.18" stroke-dasharray="2 1">\n<path d="M0 0L10 0"\/>/);
  });
});
