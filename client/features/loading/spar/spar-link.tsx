import { Link } from 'react-router-dom';
import type { Workspace } from '#client/lib/workspace.ts';

interface SparLinkProps {
  workspace: Pick<Workspace, 'select'>;
  /** such as `wing/spar-top` */
  lineId: string;
  name: string;
  href: string;
}

/** Opens the drawing with the strip picked. */
export function SparLink({ workspace, lineId, name, href }: SparLinkProps) {
  return (
    <Link to={href} className="link font-semibold" onClick={() => workspace.select(lineId)}>
      {name}
    </Link>
  );
}
