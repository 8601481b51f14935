import { SelectField } from '#src/components/select-field.tsx';
import { TextArea } from '#src/components/text-area.tsx';
import { hazardTags } from '#contracts/words.ts';
import { useBench, useFault } from '../bench.ts';
import { BlockFrame } from '../block-frame.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { LabelledInput } from '../line-fields.tsx';
import { cautionFor } from './caution-list.ts';
import { blankCaution, caution, type CautionData } from './caution.ts';

const choices = [{ value: '', label: 'In my own words' }, ...hazardTags.map((tag) => ({ value: tag, label: cautionFor(tag).title }))];

function CautionDesk({ id, data, onChange }: BlockDeskProps<CautionData>) {
  const bench = useBench();
  const listed = data.hazard === null ? null : cautionFor(data.hazard);
  const pick = (value: string) => onChange((now) => ({ ...now, hazard: hazardTags.find((tag) => tag === value) ?? null }));
  const error = useFault(`${id}.words`);
  return (
    <BlockFrame kind="wrong" word="Caution" note="beside what it warns of">
      <div className="mt-2 space-y-3">
        <SelectField name={`${id}.hazard`} label="Caution" options={choices} value={data.hazard ?? ''} onChange={(event) => pick(event.target.value)} />
        {listed && (
          <div className="max-w-reading border-l-[3px] border-rule-strong pl-3 text-small">
            <p><b>{listed.title}.</b> {listed.words}</p>
            <p className="mt-1 text-ink-soft">{listed.source ? `Source: ${listed.source}` : 'Common practice, no published source.'}</p>
          </div>
        )}
        <LabelledInput name={`${id}.title`} label={listed ? 'Another heading, if you want one' : 'Heading'} value={data.title} maxLength={160} onValue={(title) => onChange((now) => ({ ...now, title }))} />
        <TextArea
          name={`${id}.words`} label={listed ? 'Your own words instead, if you want them' : 'What to beware of'} rows={2} full value={data.words} maxLength={2000} {...(error ? { error } : {})}
          onChange={(event) => { const words = event.target.value; onChange((now) => ({ ...now, words })); }} onBlur={() => bench.touch(`${id}.words`)}
        />
      </div>
    </BlockFrame>
  );
}

export const cautionDesk = deskBlock<CautionData>({
  word: 'Caution', kind: () => 'wrong', version: caution.version, Desk: CautionDesk, blank: blankCaution,
  words: (data) => [data.title, data.words, data.hazard ? cautionFor(data.hazard).title : ''].map((part) => part.trim()).filter(Boolean).join('. '),
});
