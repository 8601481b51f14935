import { BlockFrame } from '../block-frame.tsx';
import { useBench } from '../bench.ts';
import { Choice } from '#src/components/choice.tsx';
import { TextArea } from '#src/components/text-area.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { blankFinding, finding, type FindingData } from './finding.ts';

const verdicts = [{ value: 'worked', label: 'Worked' }, { value: 'wrong', label: 'Went wrong' }];

function FindingDesk({ id, data, onChange }: BlockDeskProps<FindingData>) {
  const bench = useBench();
  const wrong = data.verdict === 'wrong';
  const field = (name: 'tried' | 'happened' | 'instead', label: string) => (
    <TextArea
      name={`${id}.${name}`} label={label} rows={2} value={data[name]} error={bench.fault(`${id}.${name}`)} maxLength={2000}
      onChange={(event) => { const words = event.target.value; onChange((now) => ({ ...now, [name]: words })); }} onBlur={() => bench.touch(`${id}.${name}`)}
    />
  );
  return (
    <BlockFrame kind={data.verdict} word={wrong ? 'Went wrong' : 'Worked'}>
      <div className="mt-2 space-y-3">
        <Choice name={`${id}.verdict`} label="How it went" inline options={verdicts} value={data.verdict} onChange={(value) => onChange((now) => ({ ...now, verdict: value === 'worked' ? 'worked' : 'wrong' }))} />
        {field('tried', 'What was tried')}
        {field('happened', wrong ? 'What happened' : 'What came of it')}
        {field('instead', wrong ? 'What to do instead' : 'Next time')}
      </div>
    </BlockFrame>
  );
}

export const findingDesk = deskBlock<FindingData>({
  word: 'Worked, or went wrong', kind: (data) => data.verdict, version: finding.version, Desk: FindingDesk, blank: blankFinding,
  words: (data) => [data.verdict === 'wrong' ? 'Went wrong' : 'Worked', data.tried, data.happened, data.instead].map((part) => part.trim()).filter(Boolean).join('. '),
});
