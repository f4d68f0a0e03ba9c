type GridColumnShape = {
  /** Name of the field in the items; also what the server sorts by. */
  field: string;
  header: string;
  unit?: string;
  widthPx?: number;
  sortable?: boolean;
};

export type GridColumn = GridColumnShape &
  ({ kind: 'number' | 'count' | 'text' } | { kind: 'choice'; words: Readonly<Record<string, string>> });

export type GridFilter =
  | { kind: 'choice'; param: string; label: string; choices: readonly { value: string; label: string }[] }
  | { kind: 'text'; param: string; label: string }
  | { kind: 'range'; minParam: string; maxParam: string; label: string; unit?: string };

export type FilterValues = Readonly<Record<string, string>>;
export type GridSort = { field: string; order: 'asc' | 'desc' };
