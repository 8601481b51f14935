import type { MouseEvent } from 'react';
import { Button, type ButtonProps } from './button.tsx';

export interface SubmitButtonProps extends Omit<ButtonProps, 'type'> {
  pending?: boolean;
  /** What the button says meanwhile: "Signing off". */
  pendingWord?: string;
}

/** While the answer is on its way it keeps the focus and takes no second press. */
export function SubmitButton({ pending = false, pendingWord, children, onClick, ...rest }: SubmitButtonProps) {
  const press = (event: MouseEvent<HTMLButtonElement>) => {
    if (pending) event.preventDefault();
    else onClick?.(event);
  };
  return (
    <Button type="submit" aria-disabled={pending || undefined} onClick={press} {...rest}>
      {pending ? (pendingWord ?? children) : children}
    </Button>
  );
}
