export interface Paging {
  readonly page: number;
  readonly pages: number;
  readonly offset: number;
}

/** The page asked for, held within what there is. */
export function pageOf(asked: number, count: number, size: number): Paging {
  const pages = Math.max(1, Math.ceil(count / size));
  const page = Math.min(Math.max(1, asked), pages);
  return { page, pages, offset: (page - 1) * size };
}
