import type { ComponentProps } from 'react';
import { controlLook } from './field.tsx';

export interface SelectOption {
  value: string;
  label: string;
}

export interface SelectBoxProps extends Omit<ComponentProps<'select'>, 'className' | 'children'> {
  options: readonly SelectOption[];
  /** As wide as its longest option, rather than as what it stands in. */
  snug?: boolean;
}

/** The browser's own list in our own box. */
export function SelectBox({ options, snug = false, ...select }: SelectBoxProps) {
  return (
    <span className={`relative ${snug ? 'inline-block' : 'block'}`}>
      <select {...select} className={`${controlLook} appearance-none pr-9 ${snug ? 'w-auto' : 'w-full'}`}>
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
      <svg viewBox="0 0 12 8" width="12" height="8" aria-hidden="true" className="pointer-events-none absolute right-3 top-1/2 -translate-y-1/2">
        <path d="M1 1l5 5 5-5" fill="none" stroke="currentColor" strokeWidth="2" />
      </svg>
    </span>
  );
}
