import { Select } from '#client/components/ui/select.tsx';
import type { Covering, Glue, Sheet, TipBlock } from '#shared/core/plan.ts';
import { ChoiceOf } from './choice-of.tsx';
import { FACES } from './face-fields.tsx';
import type { Form } from './form.ts';
import { NumberOf } from './number-of.tsx';
import { RangeOf } from './several-of.tsx';

export function TipBlockFields({ form }: { form: Form<TipBlock> }) {
  return (
    <>
      <NumberOf form={form} field="length" label="Length" quantity="length" />
      <NumberOf form={form} field="hollow" label="Hollowed out" quantity="share" />
    </>
  );
}

export function SheetFields({ form }: { form: Form<Sheet> }) {
  return (
    <>
      <NumberOf form={form} field="thickness" label="Thickness" quantity="length" />
      <NumberOf form={form} field="cutout" label="Cut out" quantity="share" />
    </>
  );
}

export function CoveringFields({ form }: { form: Form<Covering> }) {
  return (
    <>
      <ChoiceOf form={form} field="seat" label="Place" options={FACES} />
      <RangeOf form={form} from="from" to="to" label="From – to" quantity="length" />
      <NumberOf form={form} field="overlap" label="Overlap" quantity="share" />
    </>
  );
}

/** Glue is counted by its joints or taken as a share of the wood. */
export function GlueFields({ form }: { form: Form<Glue> }) {
  const { value, set, issue, readOnly } = form;
  const change = (method: string) => {
    if (method === 'share') set({ method, share: value.share ?? 0.05 }, 'method');
    else set({ method: 'joints', layers: value.layers ?? 1 }, 'method');
  };
  return (
    <>
      <Select
        inline
        label="Counted by"
        value={value.method}
        options={[
          { value: 'joints', label: 'Its joints' },
          { value: 'share', label: 'A share of the wood' },
        ]}
        error={issue('method')}
        keepRoom={false}
        disabled={readOnly}
        onValue={change}
      />
      {value.method === 'share' ? (
        <NumberOf form={form} field="share" label="Of the wood" quantity="fineShare" />
      ) : (
        <NumberOf form={form} field="layers" label="Layers" quantity="ratio" optional />
      )}
    </>
  );
}
