import { paths } from '#client/app/paths.ts';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { SheetsPlace } from '#client/features/sheets/sheets-place.tsx';

export function SheetsPage() {
  return <SheetsPlace workspace={useWorkspace()} sheetHref={paths.sheet} />;
}
