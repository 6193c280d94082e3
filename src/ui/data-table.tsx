import { useId } from 'react';
import type { CSSProperties, ReactNode } from 'react';
import { useTheme } from './theme';
import { FONTS, HAIRLINE_PX, SIZES, SPACE, TABLE_STACKS_BELOW_PX } from './tokens';
import type { Colors } from './tokens';
import { useIsAtLeast } from './use-is-wide';

export type ColumnKind = 'words' | 'figure' | 'code';

export interface DataColumn {
  key: string;
  title: string;
  unit?: string;
  /** Figures stand right, in the mono face; codes and times stand left in it; words stand left. */
  kind?: ColumnKind;
}

/** By column key. `id` tells rows apart where the first column does not. */
export type DataRow = { id?: string } & Record<string, ReactNode>;

export interface DataTableProps {
  caption: string;
  /** The first column names the row. */
  columns: DataColumn[];
  rows: DataRow[];
  isCaptionHidden?: boolean;
  /** Stands in place of the rows when there are none. */
  emptyText?: string;
}

/** A real table; on a narrow phone one with many columns becomes one small block per row. */
export function DataTable({ caption, columns, rows, isCaptionHidden = false, emptyText }: DataTableProps) {
  const { colors } = useTheme();
  const captionId = useId();
  const hasRoom = useIsAtLeast(TABLE_STACKS_BELOW_PX);
  const isStacked = !hasRoom && columns.length > 3;
  const captionStyle: CSSProperties = isCaptionHidden
    ? { position: 'absolute', width: 1, height: 1, overflow: 'hidden', clipPath: 'inset(50%)' }
    : { textAlign: 'left', paddingBottom: SPACE.x1, color: colors.inkSecond, fontSize: SIZES.small };
  const table = (
    <table role="table" aria-labelledby={captionId} style={tableStyle(colors, isStacked)}>
      <caption id={captionId} style={isStacked ? { ...captionStyle, display: 'block' } : captionStyle}>
        {caption}
      </caption>
      {isStacked ? null : <Head columns={columns} />}
      <tbody role="rowgroup" style={isStacked ? { display: 'block' } : undefined}>
        {rows.map((row, index) => (
          <BodyRow key={row.id ?? index} row={row} columns={columns} isStacked={isStacked} />
        ))}
        {rows.length === 0 && emptyText !== undefined ? (
          <tr>
            <td colSpan={columns.length} style={{ ...cellStyle(colors, 'words'), color: colors.inkSecond }}>
              {emptyText}
            </td>
          </tr>
        ) : null}
      </tbody>
    </table>
  );
  if (isStacked) return table;
  return (
    // Wider than its place it scrolls sideways by itself, which a keyboard can do only where it can be focused.
    <div
      role="region"
      aria-labelledby={captionId}
      tabIndex={0}
      style={{ overflowX: 'auto', maxWidth: '100%', position: 'relative' }}
    >
      {table}
    </div>
  );
}

function Head({ columns }: { columns: DataColumn[] }) {
  const { colors } = useTheme();
  return (
    <thead>
      <tr>
        {columns.map((column) => (
          <th
            key={column.key}
            scope="col"
            style={{
              ...cellStyle(colors, column.kind ?? 'words'),
              fontFamily: FONTS.regular,
              color: colors.inkSecond,
              verticalAlign: 'bottom',
              borderBottomColor: colors.ink,
            }}
          >
            {column.title}
            {column.unit === undefined || column.unit === '' ? null : (
              <span style={{ display: 'block', color: colors.inkThird, fontSize: SIZES.label }}>
                {column.unit}
              </span>
            )}
          </th>
        ))}
      </tr>
    </thead>
  );
}

interface BodyRowProps {
  row: DataRow;
  columns: DataColumn[];
  isStacked: boolean;
}

function BodyRow({ row, columns, isStacked }: BodyRowProps) {
  const { colors } = useTheme();
  if (isStacked) return <StackedRow row={row} columns={columns} />;
  return (
    <tr>
      {columns.map((column, index) => {
        const style = cellStyle(colors, column.kind ?? 'words');
        return index === 0 ? (
          <th
            key={column.key}
            scope="row"
            style={{ ...style, fontFamily: isMono(column.kind) ? FONTS.mono : FONTS.medium }}
          >
            {row[column.key]}
          </th>
        ) : (
          <td key={column.key} style={style}>
            {row[column.key]}
          </td>
        );
      })}
    </tr>
  );
}

/** Roles are repeated because a changed `display` takes a table's own away. */
function StackedRow({ row, columns }: { row: DataRow; columns: DataColumn[] }) {
  const { colors } = useTheme();
  return (
    <tr
      role="row"
      style={{ display: 'block', padding: `${SPACE.x2}px 0`, borderBottom: `1px solid ${colors.line}` }}
    >
      {columns.map((column, index) => (
        <td
          key={column.key}
          role={index === 0 ? 'rowheader' : 'cell'}
          style={{
            display: 'flex',
            justifyContent: 'space-between',
            gap: SPACE.x3,
            padding: '2px 0',
            fontFamily: isMono(column.kind) ? FONTS.mono : index === 0 ? FONTS.medium : FONTS.regular,
            fontSize: SIZES.small,
            lineHeight: 1.4,
            color: colors.ink,
          }}
        >
          {index === 0 ? (
            row[column.key]
          ) : (
            <>
              <span style={{ fontFamily: FONTS.regular, color: colors.inkSecond }}>
                {column.title}
                {column.unit === undefined || column.unit === '' ? '' : `, ${column.unit}`}
              </span>
              <span style={{ textAlign: 'right', overflowWrap: 'anywhere' }}>{row[column.key]}</span>
            </>
          )}
        </td>
      ))}
    </tr>
  );
}

function tableStyle(colors: Colors, isStacked: boolean): CSSProperties {
  return {
    display: isStacked ? 'block' : 'table',
    width: '100%',
    borderCollapse: 'collapse',
    color: colors.ink,
    fontSize: SIZES.small,
    lineHeight: 1.4,
  };
}

function cellStyle(colors: Colors, kind: ColumnKind): CSSProperties {
  return {
    padding: `${SPACE.x2}px ${SPACE.x2}px`,
    borderBottom: `${HAIRLINE_PX}px solid ${colors.lineFaint}`,
    textAlign: kind === 'figure' ? 'right' : 'left',
    fontFamily: isMono(kind) ? FONTS.mono : FONTS.regular,
    fontWeight: 'normal',
    fontVariantNumeric: isMono(kind) ? 'tabular-nums' : undefined,
    whiteSpace: isMono(kind) ? 'nowrap' : undefined,
    verticalAlign: 'top',
    color: colors.ink,
  };
}

function isMono(kind: ColumnKind | undefined): boolean {
  return kind === 'figure' || kind === 'code';
}
