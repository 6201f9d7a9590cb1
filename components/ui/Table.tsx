import { useEffect, useRef, useState, type KeyboardEvent, type ReactNode } from 'react';
import { ScrollView, StyleSheet, View, type DimensionValue } from 'react-native';

import { useSingleKeys } from './preferences';
import { rowForKey } from './table-keys';
import { HiddenText, Text } from './Text';
import { color, radius, space } from './tokens';
import { typingInto } from './typing-into';
import { webStyle } from './web-style';

export interface Column<Row> {
  readonly key: string;
  readonly title: string;
  /** The head is only read out: a column of buttons. */
  readonly titleHidden?: boolean;
  /** px; takes a share of what is left when left out. */
  readonly width?: number;
  /** Share of what is left; 1 when left out. */
  readonly share?: number;
  readonly align?: 'left' | 'right';
  readonly cell: (row: Row) => ReactNode;
}

export interface TableProps<Row> {
  /** What the rows are, for screen readers: "Jobs". */
  readonly label: string;
  readonly columns: readonly Column<Row>[];
  readonly rows: readonly Row[];
  readonly rowKey: (row: Row) => string;
  /** Read out for a row: "Harrow Street galley, Drawn". */
  readonly rowLabel: (row: Row) => string;
  readonly selected?: string | null;
  readonly onSelect?: (key: string) => void;
  /** Enter or a press on the row. */
  readonly onOpen?: (row: Row) => void;
  /** px; narrower pages scroll the table sideways. */
  readonly minWidth?: number;
  /** px of one row, 44 or more. */
  readonly rowHeight?: number;
  /** J and K move from anywhere on the page, not only inside the table. On for the page's main list. */
  readonly main?: boolean;
}

/** A table of rows that can be walked with J, K or arrows and opened with Enter. */
export function Table<Row>(props: TableProps<Row>) {
  const { label, columns, rows, rowKey, selected = null, onSelect, main = false, minWidth = 0 } = props;
  const [letters] = useSingleKeys();
  const [focused, setFocused] = useState<string | null>(null);
  const body = useRef<View>(null);
  const at = rows.findIndex((row) => rowKey(row) === (focused ?? selected));

  const goTo = (index: number) => {
    const row = rows[index];
    if (!row) return;
    setFocused(rowKey(row));
    onSelect?.(rowKey(row));
    rowElements(body.current)[index]?.focus();
  };
  const onKey = (key: string): boolean => {
    const next = rowForKey(key, at, rows.length, letters);
    if (next !== null) goTo(next);
    return next !== null;
  };
  usePageKeys(main && letters, onKey);

  return (
    <View style={styles.frame}>
      <ScrollView horizontal={minWidth > 0} contentContainerStyle={styles.stretch}>
        <View role="table" aria-label={label} aria-rowcount={rows.length + 1} style={[styles.table, { minWidth }]}>
          <View role="row" style={styles.head}>
            {columns.map((column) => (
              <View key={column.key} role="columnheader" style={[styles.cell, cellStyle(column)]}>
                {column.titleHidden ? (
                  <HiddenText>{column.title}</HiddenText>
                ) : (
                  <Text kind="labelSmall" tone="ink2">
                    {column.title}
                  </Text>
                )}
              </View>
            ))}
          </View>
          <View role="rowgroup" ref={body}>
            {rows.map((row, index) => (
              <TableRow
                key={rowKey(row)}
                {...props}
                row={row}
                index={index}
                first={at < 0 ? index === 0 : index === at}
                onFocus={() => setFocused(rowKey(row))}
                onKey={onKey}
              />
            ))}
          </View>
        </View>
      </ScrollView>
    </View>
  );
}

interface TableRowProps<Row> extends TableProps<Row> {
  readonly row: Row;
  readonly index: number;
  /** Tab reaches this one. */
  readonly first: boolean;
  readonly onFocus: () => void;
  readonly onKey: (key: string) => boolean;
}

function TableRow<Row>(props: TableRowProps<Row>) {
  const {
    columns,
    row,
    rowKey,
    rowLabel,
    selected,
    index,
    first,
    onSelect,
    onOpen,
    onFocus,
    onKey,
    rowHeight = 56,
  } = props;
  const chosen = rowKey(row) === selected;
  const walks = onOpen !== undefined || onSelect !== undefined;
  const onKeyDown = (event: KeyboardEvent<HTMLElement>) => {
    if (event.ctrlKey || event.metaKey || event.altKey || typingInto(event.target)) return;
    if (event.target !== event.currentTarget && (event.key === 'Enter' || event.key === ' ')) return;
    if (event.key === 'Enter' && onOpen) onOpen(row);
    else if (event.key === ' ' && onSelect) onSelect(rowKey(row));
    else if (!onKey(event.key)) return;
    event.preventDefault();
    event.stopPropagation();
  };
  return (
    <View
      role="row"
      aria-rowindex={index + 2}
      aria-label={rowLabel(row)}
      aria-selected={walks ? chosen : undefined}
      tabIndex={walks ? (first ? 0 : -1) : undefined}
      dataSet={{ row: 'true' }}
      onFocus={onFocus}
      onKeyDown={walks ? onKeyDown : undefined}
      onClick={
        walks
          ? (event) => {
              if (isControl(event.target, event.currentTarget)) return;
              onSelect?.(rowKey(row));
              onOpen?.(row);
            }
          : undefined
      }
      style={[styles.row, { minHeight: rowHeight }, walks && styles.pressable, chosen && styles.chosen]}
    >
      {chosen && <View style={styles.mark} />}
      {columns.map((column) => (
        <View key={column.key} role="cell" style={[styles.cell, cellStyle(column)]}>
          {column.cell(row)}
        </View>
      ))}
    </View>
  );
}

/** J and K for the page's main list, wherever the focus is, unless something is typed. */
function usePageKeys(active: boolean, onKey: (key: string) => boolean): void {
  const latest = useRef(onKey);
  useEffect(() => {
    latest.current = onKey;
  });
  useEffect(() => {
    if (!active) return;
    const onKeyDown = (event: globalThis.KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey || typingInto(event.target)) return;
      if ((event.key === 'j' || event.key === 'k') && latest.current(event.key)) event.preventDefault();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [active]);
}

const rowElements = (body: View | null): readonly HTMLElement[] =>
  Array.from((body as unknown as HTMLElement | null)?.querySelectorAll<HTMLElement>('[data-row]') ?? []);

/** A press on a button, a link or a field inside a row belongs to that, not to the row. */
function isControl(target: EventTarget, row: EventTarget): boolean {
  const control =
    target instanceof Element ? target.closest('a,button,input,select,textarea,[role=button],[role=checkbox]') : null;
  return control !== null && control !== row;
}

function cellStyle<Row>(column: Column<Row>) {
  const size: { readonly width?: DimensionValue; readonly flex?: number } =
    column.width === undefined ? { flex: column.share ?? 1 } : { width: column.width };
  return [size, column.align === 'right' && styles.right];
}

const styles = StyleSheet.create({
  frame: {
    borderWidth: 1,
    borderColor: color.line,
    borderRadius: radius.card,
    backgroundColor: color.card,
    overflow: 'hidden',
  },
  stretch: { flexGrow: 1 },
  table: { flexGrow: 1, flexShrink: 0, flexBasis: 'auto', ...webStyle({ width: '100%' }) },
  head: {
    flexDirection: 'row',
    alignItems: 'center',
    minHeight: 38,
    borderBottomWidth: 2,
    borderBottomColor: color.ink,
  },
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    borderBottomWidth: 1,
    borderBottomColor: color.line,
    outlineOffset: -3,
  },
  pressable: webStyle({ cursor: 'pointer' }),
  chosen: { backgroundColor: color.chalkT },
  mark: { position: 'absolute', left: 0, top: 0, bottom: 0, width: 6, backgroundColor: color.chalk },
  cell: { paddingHorizontal: space.m, paddingVertical: space.s, minWidth: 0, justifyContent: 'center' },
  right: { alignItems: 'flex-end' },
});
