import { Link } from 'react-router-dom';
import { Amount } from '#client/components/ui/amount.tsx';
import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderSummaryDto } from '#shared/schemas/glider.ts';
import { GliderMenu } from './glider-menu.tsx';
import { halfSpanOf, OutlinePicture } from './outline-picture.tsx';

interface BenchTableProps {
  gliders: readonly GliderSummaryDto[];
  hrefOf: (id: string) => string;
}

const ROLE_WORDS = { owner: '', builder: 'you build', pilot: 'you fly', reader: 'you read' } as const;

/** The gliders as ruled rows; on the phone the figures stand under the name. */
export function BenchTable({ gliders, hrefOf }: BenchTableProps) {
  const names = gliders.map(({ name }) => name);
  const widest = Math.max(1, ...gliders.map(({ outline }) => halfSpanOf(outline)));
  return (
    <Table caption="Gliders on the bench">
      <thead className="max-sm:sr-only">
        <tr>
          <Th className="w-36">
            <span className="sr-only">Picture</span>
          </Th>
          <Th>Glider</Th>
          <Th numeric>Mass</Th>
          <Th numeric>Balance</Th>
          <Th numeric>Wing loading</Th>
          <Th numeric>Last change</Th>
          <Th>
            <span className="sr-only">Actions</span>
          </Th>
        </tr>
      </thead>
      <tbody className="max-sm:border-t max-sm:border-strong-rule">
        {gliders.map((glider) => (
          <BenchRow key={glider.id} glider={glider} names={names} widest={widest} href={hrefOf(glider.id)} />
        ))}
      </tbody>
    </Table>
  );
}

interface BenchRowProps {
  glider: GliderSummaryDto;
  names: string[];
  /** half span of the largest, mm: the pictures are to one scale */
  widest: number;
  href: string;
}

function BenchRow({ glider, names, widest, href }: BenchRowProps) {
  const { name, figures, outline, role, ownerName, updatedAt } = glider;
  const mass = <Amount value={figures.mass} quantity="mass" />;
  const balance = <Amount value={figures.percentMac} quantity="percentMac" of="MAC" />;
  const loading = <Amount value={figures.wingLoading} quantity="loading" />;
  const moment = <time dateTime={updatedAt}>{formatMoment(updatedAt)}</time>;
  return (
    <tr className="group relative hover:bg-ink-wash">
      <Td className="h-16! w-36 max-sm:w-20 max-sm:pt-4 max-sm:align-top">
        <OutlinePicture outline={outline} widest={widest} className="h-9 w-32 max-sm:h-7 max-sm:w-[4.5rem]" />
      </Td>
      <RowTh className="max-sm:py-3">
        <Link
          to={href}
          className="font-semibold text-pencil no-underline group-hover:text-ink after:absolute after:inset-0"
        >
          {name}
        </Link>
        {role !== 'owner' && (
          <span className="block text-note text-graphite">
            {ownerName}’s, {ROLE_WORDS[role]}
          </span>
        )}
        <span className="flex flex-wrap gap-x-3 text-note sm:hidden">
          {mass}
          {balance}
          {loading}
          <span className="text-graphite">{moment}</span>
        </span>
      </RowTh>
      <Td numeric className="max-sm:hidden">
        {mass}
      </Td>
      <Td numeric className="max-sm:hidden">
        {balance}
      </Td>
      <Td numeric className="max-sm:hidden">
        {loading}
      </Td>
      <Td numeric className="text-graphite max-sm:hidden">
        {moment}
      </Td>
      <Td className="relative z-1 w-12 text-right">
        <GliderMenu glider={glider} taken={names} />
      </Td>
    </tr>
  );
}
