export interface LoadingProps {
  /** "Fetching the shelf". */
  label: string;
  shape?: 'rows' | 'page' | 'slip';
  count?: number;
}

/** Keeps the shape of what is coming, so that nothing moves when it does. */
export function Loading({ label, shape = 'rows', count = 4 }: LoadingProps) {
  return (
    <div role="status">
      <span className="sr-only">{label}</span>
      <div aria-hidden="true" className="waiting">
        {shape === 'page' && (
          <>
            <div className="h-4 w-48 bg-rule" />
            <div className="mt-4 h-11 w-[min(28rem,90%)] bg-rule" />
            <div className="mt-4 h-6 w-[min(36rem,100%)] bg-rule" />
            <div className="mt-10 h-64 bg-rule" />
          </>
        )}
        {shape === 'rows' && Array.from({ length: count }, (_, index) => <LoadingRow key={index} />)}
        {shape === 'slip' && <div className="h-40 border-l-[5px] border-rule bg-rule" />}
      </div>
    </div>
  );
}

function LoadingRow() {
  return (
    <div className="flex gap-5 border-b border-rule py-4">
      <div className="h-[90px] w-[132px] flex-none bg-rule" />
      <div className="flex-1">
        <div className="h-3.5 w-32 bg-rule" />
        <div className="mt-3 h-5 w-3/4 bg-rule" />
      </div>
    </div>
  );
}
