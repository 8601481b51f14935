import { BlockFrame } from '../block-frame.tsx';
import { useBench, useFault } from '../bench.ts';
import { Choice } from '#src/components/choice.tsx';
import { TextArea } from '#src/components/text-area.tsx';
import { deskBlock, type BlockDeskProps } from '../desk-block.ts';
import { blankFinding, finding, type FindingData } from './finding.ts';

const verdicts = [{ value: 'worked', label: 'Worked' }, { value: 'wrong', label: 'Went wrong' }];

type Part = 'tried' | 'happened' | 'instead';

function FindingWords({ id, name, label, value, onWords }: { id: string; name: Part; label: string; value: string; onWords: (words: string) => void }) {
  const { touch } = useBench();
  const path = `${id}.${name}`;
  return <TextArea name={path} label={label} rows={2} full value={value} error={useFault(path)} maxLength={2000} onChange={(event) => onWords(event.target.value)} onBlur={() => touch(path)} />;
}

function FindingDesk({ id, data, onChange }: BlockDeskProps<FindingData>) {
  const wrong = data.verdict === 'wrong';
  const field = (name: Part, label: string) => <FindingWords id={id} name={name} label={label} value={data[name]} onWords={(words) => onChange((now) => ({ ...now, [name]: words }))} />;
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
