import { Link } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { buttonClass } from '#client/components/ui/button.tsx';
import { useTitle } from '#client/hooks/use-title.ts';
import { SheetPaper } from '../sheet-paper.tsx';

export function NotFoundPage() {
  useTitle('Nothing here');
  return (
    <SheetPaper narrow>
      <h1 className="text-figure font-semibold">There is no such page</h1>
      <p className="mt-2">The address is wrong, or what stood here was deleted.</p>
      <p className="mt-5 flex flex-wrap gap-3">
        <Link to={paths.home} className={buttonClass('primary')}>
          To the start
        </Link>
        <Link to={paths.sample()} className={buttonClass('quiet')}>
          Open the sample glider
        </Link>
      </p>
    </SheetPaper>
  );
}
