import type { ComponentProps, KeyboardEvent, ReactNode } from 'react';
import { controlClass, controlProps, fieldId, FieldNotes } from '#src/components/field.tsx';
import { useBench, useFault } from './bench.ts';

/** 44 px for cold hands on a phone. */
export const tall = 'max-wide:min-h-11';

export interface LineFieldProps {
  /** `block.line.field`, the path its fault comes under. */
  name: string;
  label: string;
  value: string;
  onValue: (value: string) => void;
  /** Enter adds a line, or goes on to the next. */
  onEnter?: () => void;
}

function onEnterKey(act: (() => void) | undefined) {
  return (event: KeyboardEvent) => {
    if (event.key !== 'Enter' || event.nativeEvent.isComposing || !act) return;
    event.preventDefault();
    act();
  };
}

/** What every control of a line has: name, id, fault, and that leaving it shows the fault. */
export function useLineControl(name: string, label: string) {
  const bench = useBench();
  const error = useFault(name);
  return { error, control: controlProps({ name, label, error }), leave: () => bench.touch(name) };
}

type InputRest = Omit<ComponentProps<'input'>, 'className' | 'id' | 'name' | 'value' | 'onChange'>;

/** A bare box of a line; its label is read out only. */
export function LineInput({ name, label, value, onValue, onEnter, look = '', ...rest }: LineFieldProps & InputRest & { look?: string }) {
  const { control, leave } = useLineControl(name, label);
  return (
    <input
      {...rest} {...control} aria-label={label} value={value} autoComplete="off" className={`${controlClass} ${tall} ${look}`}
      onChange={(event) => onValue(event.target.value)} onBlur={leave} onKeyDown={onEnterKey(onEnter)}
    />
  );
}

/** A figure: money, hours, an amount. */
export function FigureInput(props: LineFieldProps & InputRest & { look?: string }) {
  return <LineInput {...props} type="text" inputMode="decimal" look={`text-right ${props.look ?? ''}`} />;
}

export interface Option {
  value: string;
  label: string;
}

/** A box with its label above and its fault below. */
export function LabelledInput({ label, hint, figure = false, ...props }: LineFieldProps & InputRest & { hint?: ReactNode; figure?: boolean }) {
  const { control, error, leave } = useLineControl(props.name, label);
  const { name, value, onValue, onEnter, ...rest } = props;
  const described = hint ? [`${control.id}-hint`, control['aria-describedby']].filter(Boolean).join(' ') : control['aria-describedby'];
  return (
    <div>
      <label htmlFor={control.id} className="mb-[5px] block text-small font-semibold">{label}</label>
      <input
        {...rest} {...control} name={name} aria-describedby={described} value={value} autoComplete="off" className={`${controlClass} ${tall}`}
        {...(figure ? { type: 'text', inputMode: 'decimal' as const } : {})}
        onChange={(event) => onValue(event.target.value)} onBlur={leave} onKeyDown={onEnterKey(onEnter)}
      />
      <FieldNotes id={control.id} hint={hint} error={error} />
    </div>
  );
}

export function LabelledSelect({ name, label, value, onValue, options }: Omit<LineFieldProps, 'onEnter'> & { options: readonly Option[] }) {
  const { control, error } = useLineControl(name, label);
  return (
    <div>
      <label htmlFor={control.id} className="mb-[5px] block text-small font-semibold">{label}</label>
      <select {...control} value={value} onChange={(event) => onValue(event.target.value)} className={`${controlClass} select-control pr-8 ${tall}`}>
        {options.map((option) => <option key={option.value} value={option.value}>{option.label}</option>)}
      </select>
      <FieldNotes id={control.id} error={error} />
    </div>
  );
}

/** A choice that mostly stays as it is: reads as a word of the line until it is touched. */
export function QuietSelect({ name, label, value, onValue, options, strong = false }: Omit<LineFieldProps, 'onEnter'> & { options: readonly Option[]; strong?: boolean }) {
  return (
    <select
      id={fieldId(name)} name={name} aria-label={label} value={value} onChange={(event) => onValue(event.target.value)}
      className={`quiet-select min-h-7 ${tall} cursor-pointer rounded-edge border-0 border-b border-dashed border-rule-strong bg-transparent py-0.5 text-small hover:border-ink wide:border-transparent ${strong ? 'font-semibold text-lead' : 'text-ink-soft'}`}
    >
      {options.map((option) => <option key={option.value} value={option.value}>{option.label}</option>)}
    </select>
  );
}

/** The faults of a line, one under another, each tied to its field. */
export function LineFaults({ names }: { names: readonly string[] }) {
  return names.map((name) => <LineFault key={name} name={name} />);
}

function LineFault({ name }: { name: string }) {
  return <FieldNotes id={fieldId(name)} error={useFault(name)} />;
}

export function optionsOf<T extends string>(words: Readonly<Record<T, string>>): Option[] {
  return Object.entries<string>(words).map(([value, label]) => ({ value, label }));
}
