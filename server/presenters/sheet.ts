import type { SheetDto, SheetSummaryDto } from '#shared/schemas/sheet.ts';
import type { Sheet } from '#server/models/sheet.ts';
import { presentFigures } from './figures.ts';

type SheetHead = Omit<SheetDto, 'plan' | 'result'>;

function presentHead(row: Sheet): SheetHead {
  return {
    id: row.id,
    gliderId: row.gliderId,
    gliderName: row.gliderName,
    number: row.number,
    note: row.note,
    savedAt: row.savedAt.toISOString(),
    savedBy: row.savedByName,
    calculator: row.calculator,
    sha256: row.sha256,
  };
}

export function presentSheet(row: Sheet): SheetDto {
  return { ...presentHead(row), plan: row.plan, result: row.result };
}

export function presentSheetSummary(row: Sheet): SheetSummaryDto {
  return { ...presentHead(row), ...presentFigures(row) };
}
