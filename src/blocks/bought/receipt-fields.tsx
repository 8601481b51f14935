import { bases, basisWords, type Basis } from '#contracts/words.ts';
import { currencyExponents } from '#domain/currency.ts';
import { useBench } from '../bench.ts';
import { LabelledInput, LabelledSelect, optionsOf } from '../line-fields.tsx';
import type { BoughtData } from './bought.ts';

interface ReceiptFieldsProps {
  block: string;
  data: BoughtData;
  set: (part: Partial<BoughtData>) => void;
}

const currencies = Object.keys(currencyExponents).toSorted().map((code) => ({ value: code, label: code }));
function basisOf(value: string): Basis {
  return bases.find((one) => one === value) ?? 'paper';
}

/** Where and when, in which money, and how sure. */
export function ReceiptHead({ block, data, set }: ReceiptFieldsProps) {
  const { context } = useBench();
  const currency = data.currency ?? context.currency;
  const path = (field: string) => `${block}.${field}`;
  return (
    <div className="mt-3 grid grid-cols-2 gap-3 wide:grid-cols-[minmax(0,1fr)_10.5rem_6.5rem_9rem]">
      <div className="max-wide:col-span-2"><LabelledInput name={path('supplier')} label="Supplier" value={data.supplier} maxLength={120} onValue={(supplier) => set({ supplier })} /></div>
      <LabelledInput name={path('day')} label="Date on it" type="date" value={data.day ?? context.day} onValue={(day) => set({ day: day === '' || day === context.day ? null : day })} />
      <LabelledSelect name={path('currency')} label="Currency" value={currency} options={currencies} onValue={(code) => set({ currency: code === context.currency ? null : code })} />
      <LabelledSelect name={path('basis')} label="Figures are" value={data.basis} options={optionsOf(basisWords)} onValue={(basis) => set({ basis: basisOf(basis) })} />
      {currency !== context.currency && (
        <div className="col-span-2 wide:col-span-4">
          <LabelledInput name={path('rate')} label={`${context.currency} for one ${currency}`} figure placeholder="e.g. 0.86" hint="As your bank or the shop counted it. The whole receipt is turned once." value={data.rate} onValue={(rate) => set({ rate })} />
        </div>
      )}
    </div>
  );
}

/** What stands under the lines of a receipt: shared over them. */
export function ReceiptFoot({ block, data, set, currency }: ReceiptFieldsProps & { currency: string }) {
  const field = (name: 'discount' | 'delivery' | 'tax' | 'paperTotal', label: string) => (
    <LabelledInput name={`${block}.${name}`} label={label} figure placeholder="0.00" value={data[name]} onValue={(value) => set({ [name]: value })} />
  );
  return (
    <fieldset className="mt-3 grid grid-cols-2 gap-3 wide:grid-cols-4">
      <legend className="sr-only">Shared over the lines, in {currency}</legend>
      {field('delivery', 'Delivery')}
      {field('tax', 'Tax added on top')}
      {field('discount', 'Discount')}
      {field('paperTotal', 'Total on the paper')}
    </fieldset>
  );
}
