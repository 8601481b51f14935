/** The look of cells, shared by every table of figures. */
export const headClass = 'border-b-2 border-ink px-1.5 wide:px-3 py-[9px] text-left align-bottom text-note font-semibold whitespace-nowrap text-ink-soft';
export const cellClass = 'border-b border-rule px-1.5 wide:px-3 py-[11px] align-top';
export const numberClass = 'text-right whitespace-nowrap';
