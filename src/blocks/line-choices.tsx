import { createContext, useContext, useState, type ReactNode } from 'react';
import { fieldId } from '#src/components/field.tsx';

interface Fold { id: string; open: boolean; turn: () => void }
const FoldContext = createContext<Fold | null>(null);

function useFold(): Fold {
  const fold = useContext(FoldContext);
  if (!fold) throw new Error('The choices of a line stand outside their line');
  return fold;
}

/** One line of a block. What mostly stays as it is folds into one button on a phone, and stands in a quiet row on a wide page. */
export function FoldingLine({ name, children }: { name: string; children: ReactNode }) {
  const [open, setOpen] = useState(false);
  return (
    <FoldContext.Provider value={{ id: fieldId(`${name}.choices`), open, turn: () => setOpen(!open) }}>
      <li className="m-0! border-b border-rule py-1 wide:py-2">{children}</li>
    </FoldContext.Provider>
  );
}

interface ChoicesButtonProps {
  /** Whose choices they are: the material, the person. */
  of: string;
  /** What is chosen now: "Used, for each". */
  words: string;
  strong?: boolean;
  /** Stands over it: what is left. */
  above?: ReactNode;
}

/** On a phone what is chosen, as a button that shows the choices; it takes in what stands over it, so that it is tall enough to hit. */
export function ChoicesButton({ of, words, strong = false, above = null }: ChoicesButtonProps) {
  const { id, open, turn } = useFold();
  return (
    <div className="grid min-w-0 text-note leading-tight max-wide:text-right wide:text-small">
      {above && <p className="[grid-area:1/1] max-wide:pt-1">{above}</p>}
      <button
        type="button" aria-expanded={open} aria-controls={id} aria-label={`${words}: change how ${of} counts, or take it out`} onClick={turn}
        className={`flex min-h-11 justify-end text-right underline decoration-rule-strong decoration-dashed underline-offset-[0.2em] [grid-area:1/1] wide:hidden ${above ? 'items-end pt-5.5 pb-1' : 'items-center'} ${strong ? 'font-semibold text-lead' : 'text-ink-soft'}`}
      >
        {words}
      </button>
    </div>
  );
}

/** The choices themselves, and taking the line out. */
export function LineChoices({ children }: { children: ReactNode }) {
  const { id, open } = useFold();
  return <div id={id} className={`flex flex-wrap items-center gap-x-3.5 gap-y-1 ${open ? '' : 'max-wide:hidden'}`}>{children}</div>;
}
