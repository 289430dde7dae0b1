import { chakra } from '@chakra-ui/react';
import { ArrowDown, ArrowUp, ArrowUpDown } from 'lucide-react';
import type { ReactNode } from 'react';
import { useTranslation } from 'react-i18next';
import { tableRecipe } from './table-recipe';
import { VisuallyHidden } from './visually-hidden';

const Frame = chakra('div', tableRecipe);

export interface Column<Row> {
  key: string;
  header: string;
  cell: (row: Row) => ReactNode;
  align?: 'start' | 'end';
  /** Keeps a date or a name on one line. */
  nowrap?: boolean;
  /** The field that the server sorts by. */
  sort?: string;
}

export interface TableProps<Row> {
  /** What the table holds, for those who hear it. */
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  /** The field sorted by now, with a leading `-` for descending. */
  sort?: string;
  onSort?: (sort: string) => void;
}

function SortButton({
  field,
  sort,
  header,
  onSort,
}: {
  field: string;
  sort: string;
  header: string;
  onSort: (sort: string) => void;
}) {
  const Icon = sort === field ? ArrowUp : sort === `-${field}` ? ArrowDown : ArrowUpDown;
  return (
    <button type="button" onClick={() => onSort(sort === field ? `-${field}` : field)}>
      {header}
      <Icon size={16} aria-hidden />
    </button>
  );
}

const direction = (field: string | undefined, sort: string) =>
  field && sort === field ? 'ascending' : field && sort === `-${field}` ? 'descending' : undefined;

/** A real table on wide screens and a card a row on a phone, where each value says what it is. */
export function Table<Row>({ caption, columns, rows, keyOf, sort = '', onSort }: TableProps<Row>) {
  const { t } = useTranslation();
  return (
    <Frame>
      {/* The roles are written out because `display: block` on a phone would take them away. */}
      <table role="table">
        <caption>
          <VisuallyHidden>{caption}</VisuallyHidden>
        </caption>
        <thead role="rowgroup">
          <tr role="row">
            {columns.map((column) => (
              <th
                key={column.key}
                role="columnheader"
                scope="col"
                data-align={column.align}
                aria-sort={direction(column.sort, sort)}
              >
                {column.sort && onSort ? (
                  <SortButton
                    field={column.sort}
                    sort={sort}
                    header={column.header}
                    onSort={onSort}
                  />
                ) : (
                  column.header || <VisuallyHidden>{t('actions')}</VisuallyHidden>
                )}
              </th>
            ))}
          </tr>
        </thead>
        <tbody role="rowgroup">
          {rows.map((row) => (
            <tr key={keyOf(row)} role="row">
              {columns.map((column) => (
                <td
                  key={column.key}
                  role="cell"
                  data-align={column.align}
                  data-nowrap={column.nowrap}
                  data-label={column.header}
                >
                  {column.cell(row)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </Frame>
  );
}
