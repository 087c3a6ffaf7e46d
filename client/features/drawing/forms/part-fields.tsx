import type { Part } from '#shared/core/plan.ts';
import { CapStripFields, SkinFields, WebFields } from './face-fields.tsx';
import type { Form } from './form.ts';
import { CoveringFields, GlueFields, SheetFields, TipBlockFields } from './plain-fields.tsx';
import { RibFields } from './rib-fields.tsx';
import { StripFields } from './strip-fields.tsx';

/** The fields of a part's own kind. */
export function PartFields({ form }: { form: Form<Part> }) {
  const { value } = form;
  switch (value.kind) {
    case 'ribs':
      return <RibFields form={{ ...form, value }} />;
    case 'strip':
      return <StripFields form={{ ...form, value }} />;
    case 'skin':
      return <SkinFields form={{ ...form, value }} />;
    case 'capStrips':
      return <CapStripFields form={{ ...form, value }} />;
    case 'web':
      return <WebFields form={{ ...form, value }} />;
    case 'tipBlock':
      return <TipBlockFields form={{ ...form, value }} />;
    case 'sheet':
      return <SheetFields form={{ ...form, value }} />;
    case 'covering':
    case 'finish':
      return <CoveringFields form={{ ...form, value }} />;
    case 'glue':
      return <GlueFields form={{ ...form, value }} />;
  }
}
