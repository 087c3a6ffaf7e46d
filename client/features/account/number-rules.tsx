const FORMS: readonly (readonly [typed: string, meaning: string])[] = [
  [
    '2,5 or 2.5',
    'Comma or point is the decimal mark, whichever you type. There are no thousands marks; a space may part thousands.',
  ],
  [
    '1/16, 3 1/2, 3-1/2',
    'A stroke divides. A whole number before a proper fraction, with a space or a hyphen, is added to it: three and a half.',
  ],
  [
    '31", 3\'6", 2,5 mm, 0.4 oz, 6 lb/ft3',
    'A unit may follow, whatever the field is in. Without one, a number is in the unit of the field.',
  ],
  [
    '12 + 3.5, 31/2, 3*12.5',
    'Small sums are reckoned, products first; brackets help. To take a fraction away, put spaces round the minus: 3 - 1/2.',
  ],
  ['empty', 'Missing, not zero.'],
  ['↑ ↓', 'A sensible step: 0.5 mm, 1/16 in, 0.1 g. With Shift, ten of them.'],
];

/** How numbers are written in every field, said once. */
export function NumberRules() {
  return (
    <section aria-labelledby="number-rules">
      <h3 id="number-rules" className="mb-1 text-note font-semibold">
        How numbers are written
      </h3>
      <dl className="border-t border-rule">
        {FORMS.map(([typed, meaning]) => (
          <div key={typed} className="grid gap-x-4 border-b border-rule py-1.5 sm:grid-cols-[12rem_1fr]">
            <dt className="font-semibold">{typed}</dt>
            <dd className="text-note text-graphite">{meaning}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-2 text-note text-graphite">
        What you typed stays as you typed it; the other system stands beside it. In inches, sizes that are a
        fraction down to 1/64 are told as that fraction, as stock is sold.
      </p>
    </section>
  );
}
