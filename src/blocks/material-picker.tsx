import { useId, useMemo, useState, type KeyboardEvent } from 'react';
import type { MaterialFacts } from './block.ts';
import { useBench } from './bench.ts';
import { tall, useLineControl } from './line-fields.tsx';
import { matchingMaterials } from './material-search.ts';

export interface MaterialPickerProps {
  name: string;
  value: string;
  picked: boolean;
  onType: (name: string) => void;
  onPick: (material: MaterialFacts) => void;
  /** Asks for a material that is not on the list yet. */
  onNew: (name: string) => void;
}

const most = 8;

/**
 * Type-ahead over the restorer's materials: three letters and Enter.
 * Our own rather than a package's, because those hide the rest of the page while the list is open, and the editor takes that for an edit.
 * Follows the ARIA pattern "editable combobox with list autocomplete".
 */
export function MaterialPicker({ name, value, picked, onType, onPick, onNew }: MaterialPickerProps) {
  const bench = useBench();
  const listId = useId();
  const { control, leave } = useLineControl(name, 'Material');
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const found = useMemo(() => matchingMaterials(bench.materials, picked ? '' : value).slice(0, most), [bench.materials, picked, value]);
  const typed = value.trim();
  const offersNew = !picked && typed !== '' && !found.some((one) => one.name.toLowerCase() === typed.toLowerCase());
  const count = found.length + (offersNew ? 1 : 0);
  const at = Math.min(active, Math.max(0, count - 1));
  const shown = open && count > 0;

  const choose = (index: number) => {
    setOpen(false);
    const material = found[index];
    if (material) onPick(material);
    else if (offersNew) onNew(typed);
  };
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.nativeEvent.isComposing) return;
    if (event.key === 'ArrowDown' || event.key === 'ArrowUp') {
      event.preventDefault();
      const step = event.key === 'ArrowDown' ? 1 : -1;
      setActive(shown ? (at + step + count) % count : 0);
      setOpen(true);
    } else if (event.key === 'Enter') {
      event.preventDefault();
      if (shown && (typed !== '' || open)) choose(at);
      else if (count > 0) setOpen(true);
    } else if (event.key === 'Escape' && shown) {
      event.preventDefault();
      event.stopPropagation();
      setOpen(false);
    }
  };
  const leaveField = () => {
    setOpen(false);
    const same = bench.materials.find((one) => one.name.toLowerCase() === typed.toLowerCase());
    if (!picked && same) onPick(same);
    leave();
  };
  const optionId = (index: number) => `${listId}-${index}`;
  return (
    <div className="relative">
      <input
        {...control} type="text" role="combobox" aria-label="Material" aria-expanded={shown} aria-controls={listId} aria-autocomplete="list" aria-activedescendant={shown ? optionId(at) : undefined}
        autoComplete="off" value={value} placeholder="Which material"
        onChange={(event) => { onType(event.target.value); setActive(0); setOpen(true); }}
        onKeyDown={onKeyDown} onBlur={leaveField} onClick={() => setOpen(true)}
        className={`block w-full rounded-edge border bg-card py-2 text-control text-ink placeholder:font-normal placeholder:text-ink-faint aria-[invalid]:border-2 aria-[invalid]:border-lead ${tall} ${picked ? '-ml-2.5 border-transparent px-2.5 font-semibold text-ellipsis hover:border-edge' : 'border-edge px-[11px] font-medium'}`}
      />
      <div id={listId} role="listbox" aria-label="Materials" hidden={!shown} className="absolute top-full left-0 z-20 mt-1 max-h-80 w-[min(24rem,78vw)] overflow-y-auto border border-rule-strong bg-card">
        {shown && found.map((material, index) => (
          <Choice key={material.id} id={optionId(index)} active={index === at} onChoose={() => choose(index)} words={material.name} small={bench.figures.read().leftWords(material.id)} />
        ))}
        {shown && offersNew && <Choice id={optionId(found.length)} active={at === found.length} onChoose={() => choose(found.length)} words={`Add “${typed}” to your materials`} small={null} />}
      </div>
    </div>
  );
}

interface ChoiceProps { id: string; active: boolean; words: string; small: string | null; onChoose: () => void }

function Choice({ id, active, words, small, onChoose }: ChoiceProps) {
  return (
    // The press must not take the focus from the field, or leaving it would close the list first.
    <div id={id} role="option" aria-selected={active} tabIndex={-1} onMouseDown={(event) => event.preventDefault()} onClick={onChoose} onKeyDown={undefined}
      className={`flex min-h-10 cursor-pointer items-center justify-between gap-4 px-3 py-1.5 ${tall} ${active ? 'bg-scribe-wash text-scribe-text' : 'hover:bg-hover'}`}>
      <span className="font-medium">{words}</span>
      {small && <span className="num flex-none text-small text-ink-soft">{small}</span>}
    </div>
  );
}
