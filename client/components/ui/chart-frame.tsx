import { useId, type ReactNode } from 'react';
import { RowTh, Table, Td, Th, Tr } from './table.tsx';

export interface ChartColumn {
  label: ReactNode;
  numeric?: boolean;
}

interface ChartFrameProps {
  /** Small heading over the chart. */
  title: string;
  /** One sentence that says what the chart shows. */
  sentence: ReactNode;
  columns: readonly ChartColumn[];
  /** The same numbers as drawn, formatted; the first cell names the row. */
  rows: readonly (readonly ReactNode[])[];
  children: ReactNode;
  className?: string;
}

/** A figure with its sentence, and the exact table one press away. */
export function ChartFrame({ title, sentence, columns, rows, children, className }: ChartFrameProps) {
  const id = useId();
  return (
    <figure aria-labelledby={`${id}-title`} aria-describedby={`${id}-sentence`} className={className}>
      <figcaption>
        <span id={`${id}-title`} className="caption block">
          {title}
        </span>
        <span id={`${id}-sentence`} className="mt-0.5 block text-note text-graphite">
          {sentence}
        </span>
      </figcaption>
      <div className="mt-3">{children}</div>
      <details className="mt-2 print:hidden">
        <summary className="opens text-note font-semibold">Table</summary>
        <Table caption={title} className="mt-1 text-note">
          <thead>
            <tr>
              {columns.map((column, i) => (
                <Th key={i} numeric={column.numeric ?? false}>
                  {column.label}
                </Th>
              ))}
            </tr>
          </thead>
          <tbody>
            {rows.map((row, r) => (
              <Tr key={r}>
                {row.map((cell, c) =>
                  c === 0 ? (
                    <RowTh key={c}>{cell}</RowTh>
                  ) : (
                    <Td key={c} numeric={columns[c]?.numeric ?? false}>
                      {cell}
                    </Td>
                  ),
                )}
              </Tr>
            ))}
          </tbody>
        </Table>
      </details>
    </figure>
  );
}
