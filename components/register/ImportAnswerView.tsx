import { useEffect } from 'react';
import { StyleSheet, View } from 'react-native';
import type { ImportAnswer } from '@/shared/registerCsv';
import { useMessages } from '../i18n/useMessages';
import { rule, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { focusField, Table, Text, webProps } from '../ui';

type Fault = ImportAnswer['errors'][number];
type Row = ImportAnswer['rows'][number];

/** `qualifiedThrough` as it may be written too, and as it can break: `qualified through`. */
export const columnName = (column: string) =>
  column.replace(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);

const ID = 'csv-answer';
/** What is brought into view of it: the first heading. */
const LABEL = `${ID}-label`;

/** Lines shown before the rest is only counted. */
const MOST_SHOWN = 100;

function useFaultWord() {
  const { faults } = useMessages().register.csv;
  const words: Readonly<Record<string, string>> = faults;
  return (code: string) => words[code] ?? faults.other;
}

function Faults({ errors }: { errors: readonly Fault[] }) {
  const { register } = useMessages();
  const { isPhone } = useBreakpoint();
  const { colors } = useTheme();
  const words = register.csv;
  const faultWord = useFaultWord();
  if (isPhone) {
    return (
      <View role="list">
        {errors.map(({ line, column, code, value }, index) => (
          <View
            role="listitem"
            key={index}
            style={[styles.fault, { borderBottomColor: colors.hair }]}
          >
            <Text variant="strong">
              {[
                words.lineNumber(line),
                column && columnName(column),
                value === '' ? undefined : `“${value}”`,
              ]
                .filter((part) => part !== undefined && part !== null)
                .join(', ')}
            </Text>
            <Text>{faultWord(code)}</Text>
          </View>
        ))}
      </View>
    );
  }
  return (
    <Table
      label={words.badLines(errors.length)}
      rows={errors.map((error, index) => ({ ...error, key: String(index) }))}
      rowKey={({ key }) => key}
      columns={[
        {
          key: 'line',
          label: words.line,
          width: 70,
          cell: ({ line }) => <Text variant="strong">{String(line)}</Text>,
        },
        {
          key: 'column',
          label: words.where,
          width: 150,
          cell: ({ column }) => columnName(column ?? ''),
        },
        {
          key: 'value',
          label: words.stands,
          cell: ({ value }) => (value === '' ? words.nothing : value),
        },
        {
          key: 'whatToMend',
          label: words.whatToMend,
          share: 2,
          cell: ({ code }) => <Text variant="answer">{faultWord(code)}</Text>,
        },
      ]}
    />
  );
}

function Rows({ rows, columns }: { rows: readonly Row[]; columns: readonly string[] }) {
  const { register } = useMessages();
  const { isPhone } = useBreakpoint();
  const { colors } = useTheme();
  const words = register.csv;
  const shown = rows.slice(0, MOST_SHOWN);
  const used = columns.filter((column) => rows.some(({ cells }) => (cells[column] ?? '') !== ''));
  return (
    <>
      {isPhone ? (
        <View role="list">
          {shown.map(({ line, cells }) => (
            <View
              role="listitem"
              key={line}
              style={[styles.fault, { borderBottomColor: colors.hair }]}
            >
              <Text variant="note" color="ink2">
                {words.lineNumber(line)}
              </Text>
              <Text>
                {used
                  .map((column) => cells[column])
                  .filter(Boolean)
                  .join(', ')}
              </Text>
            </View>
          ))}
        </View>
      ) : (
        <Table
          label={words.rightLines(rows.length)}
          rows={shown}
          rowKey={({ line }) => String(line)}
          columns={[
            { key: 'line', label: words.line, width: 60, cell: ({ line }) => String(line) },
            ...used.map((column) => ({
              key: column,
              label: columnName(column),
              share: ['name', 'email', 'sites', 'site', 'laboratory'].includes(column) ? 2 : 1,
              cell: ({ cells }: Row) => cells[column] ?? '',
            })),
          ]}
        />
      )}
      {rows.length > shown.length && <Text>{words.moreRows(rows.length - shown.length)}</Text>}
    </>
  );
}

/** What the server found in the lines: first what is to mend, then what would come in. */
export function ImportAnswerView({
  answer,
  columns,
}: {
  answer: ImportAnswer;
  columns: readonly string[];
}) {
  const { register } = useMessages();
  const { colors } = useTheme();
  const words = register.csv;
  const { errors, rows } = answer;
  // It stands below the lines, often out of view: whoever pressed the button is led to it.
  useEffect(() => {
    focusField(ID);
  }, [answer]);
  return (
    <View id={ID} {...webProps({ tabIndex: -1 })} aria-live="polite" style={styles.all}>
      {errors.length > 0 && (
        <View style={[styles.part, { borderTopColor: colors.ink }]}>
          <Text variant="section" level={2} id={LABEL}>
            {words.badLines(errors.length)}
          </Text>
          <Text>{words.mend}</Text>
          <Faults errors={errors} />
        </View>
      )}
      {rows.length > 0 && (
        <View style={[styles.part, { borderTopColor: colors.ink }]}>
          <Text variant="section" level={2} id={errors.length > 0 ? undefined : LABEL}>
            {words.rightLines(rows.length)}
          </Text>
          {errors.length === 0 && <Text>{words.allRight}</Text>}
          <Rows rows={rows} columns={columns} />
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  all: { gap: space.xl },
  part: { borderTopWidth: rule.strong, paddingTop: space.sm, gap: space.xs },
  fault: { borderBottomWidth: 1, paddingVertical: space.sm, gap: 2 },
});
