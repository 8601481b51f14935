import { controlProps, FieldNotes, type FieldWords } from './field.tsx';

export interface ChoiceOption {
  value: string;
  label: string;
  hint?: string;
}

export interface ChoiceProps extends Omit<FieldWords, 'optional'> {
  options: ChoiceOption[];
  defaultValue?: string;
  value?: string;
  onChange?: (value: string) => void;
  /** Short options in one line. */
  inline?: boolean;
}

/** A radio group. */
export function Choice({ options, defaultValue, value, onChange, inline = false, ...words }: ChoiceProps) {
  const control = controlProps(words);
  const chosen = (option: string) => (value === undefined ? { defaultChecked: option === defaultValue } : { checked: option === value });
  return (
    <fieldset aria-describedby={control['aria-describedby']} aria-invalid={control['aria-invalid']}>
      <legend className="mb-1 text-small font-semibold">{words.label}</legend>
      <div className={inline ? 'flex flex-wrap gap-x-6' : ''}>
        {options.map((option, index) => (
          <label key={option.value} className="flex min-h-8 items-start gap-2.5 py-1 text-control">
            <input
              {...chosen(option.value)}
              type="radio"
              // The first answers to the group's id, so that the error summary can lead to it.
              id={index === 0 ? control.id : `${control.id}-${option.value}`}
              name={words.name}
              value={option.value}
              onChange={() => onChange?.(option.value)}
              className="mt-0.5 size-[18px] flex-none accent-scribe"
            />
            <span>
              {option.label}
              {option.hint && <span className="block text-small text-ink-soft">{option.hint}</span>}
            </span>
          </label>
        ))}
      </div>
      <FieldNotes id={control.id} hint={words.hint} error={words.error} />
    </fieldset>
  );
}
