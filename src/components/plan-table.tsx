import { Chip } from './chip.tsx';
import { PlanBar } from './plan-bar.tsx';
import { cellClass, headClass, numberClass } from './table-cells.ts';

export interface PlanRow {
  key: string;
  stage: string;
  done: boolean;
  planned: string;
  used: string;
  /** Left out when nothing says where the stage will end. */
  finishAt?: string;
  /** Minor units for the bar; null where no plan was made. */
  bar: { planned: number; used: number; over?: string } | null;
}

export interface PlanTableProps {
  caption: string;
  rows: PlanRow[];
  foot: { label: string; planned: string; used: string; finishAt?: string };
}

export function PlanTable({ caption, rows, foot }: PlanTableProps) {
  const forecast = foot.finishAt !== undefined || rows.some((row) => row.finishAt !== undefined);
  return (
    <div className="overflow-x-auto">
      <table className="num w-full border-collapse text-small wide:text-control">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr>
            <th scope="col" className={headClass}>Stage</th>
            <th scope="col" className={`${headClass} ${numberClass}`}>Planned</th>
            <th scope="col" className={`${headClass} ${numberClass}`}>Used</th>
            {forecast && <th scope="col" className={`${headClass} ${numberClass}`}>Finish at</th>}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={row.key}>
              <th scope="row" className={`${cellClass} text-left font-normal`}>
                <span className="mr-1.5">{row.stage}</span>
                {row.done && <Chip kind="grey">done</Chip>}
                {row.bar && (
                  <span className="mt-2 block">
                    <PlanBar {...row.bar} label={`${row.used} used of ${row.planned} planned`} />
                  </span>
                )}
              </th>
              <td className={`${cellClass} ${numberClass}`}>{row.planned}</td>
              <td className={`${cellClass} ${numberClass}`}>{row.used}</td>
              {forecast && <td className={`${cellClass} ${numberClass}`}>{row.finishAt}</td>}
            </tr>
          ))}
        </tbody>
        <tfoot>
          <tr className="border-t-2 border-ink font-[680]">
            <th scope="row" className="px-1.5 py-[11px] wide:px-3 text-left font-[680]">{foot.label}</th>
            <td className={`px-1.5 py-[11px] wide:px-3 ${numberClass}`}>{foot.planned}</td>
            <td className={`px-1.5 py-[11px] wide:px-3 ${numberClass}`}>{foot.used}</td>
            {forecast && <td className={`px-1.5 py-[11px] wide:px-3 ${numberClass}`}>{foot.finishAt}</td>}
          </tr>
        </tfoot>
      </table>
    </div>
  );
}
