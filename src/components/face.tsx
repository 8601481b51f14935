export interface FaceProps {
  name: string;
  size?: 'small' | 'middle';
}

/** A person by the first letter of their name. The name itself always stands beside it, or labels what it is in. */
export function Face({ name, size = 'middle' }: FaceProps) {
  const letter = Array.from(name.trim())[0]?.toLocaleUpperCase('en-GB') ?? '?';
  const box = size === 'small' ? 'size-6 text-[11px]' : 'size-[34px] text-sm';
  return (
    <span aria-hidden="true" className={`inline-grid flex-none place-items-center rounded-[50%] bg-face font-[650] text-white ${box}`}>
      {letter}
    </span>
  );
}
