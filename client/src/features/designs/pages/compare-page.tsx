import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';
import { Flag, type Tone } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { comparisonQuery, type BillComparison } from '../api/bills';
import { billAddress } from '../components/addresses';
import { lineChangeRows, planChangeRows, stepChangeRows, type ChangeRow } from '../components/changes';
import { DenseTable } from '../components/dense-table';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  const [search] = useSearchParams();
  const [from, to] = [Number(search.get('from')), Number(search.get('to'))];
  const comparison = useQuery(comparisonQuery(code, from, to));
  return (
    <>
      <PageHeading
        title={`From revision ${from} to ${to}`}
        lead={
          <>
            What changed in <Link to={billAddress(code, to)}>the bill of {code}</Link>.
          </>
        }
        tags={<Tag kind="part" code={code} />}
      />
      {comparison.isError ? (
        <ErrorState error={comparison.error} onRetry={() => void comparison.refetch()} what="The comparison" />
      ) : null}
      {comparison.isPending ? <LoadingState label="Comparing" /> : null}
      {comparison.data ? <Changes comparison={comparison.data} /> : null}
    </>
  );
}

function Changes({ comparison }: { comparison: BillComparison }): ReactElement {
  const sections = [
    { title: 'Lines', rows: lineChangeRows(comparison) },
    { title: 'Build steps', rows: stepChangeRows(comparison) },
    { title: 'Test plan', rows: planChangeRows(comparison) },
  ].filter(({ rows }) => rows.length > 0);
  if (sections.length === 0) return <EmptyState title="Nothing differs">Both revisions say the same.</EmptyState>;
  return (
    <div style={{ display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: 28 }}>
      {sections.map(({ title, rows }) => (
        <Sheet key={title} title={title} bare>
          <ChangeTable title={title} rows={rows} comparison={comparison} />
        </Sheet>
      ))}
    </div>
  );
}

const tones: Record<ChangeRow['kind'], Tone> = { added: 'sound', removed: 'hot', changed: 'tape' };
const glyphs: Record<ChangeRow['kind'], string> = { added: '+', removed: '−', changed: '△' };

interface ChangeTableProps {
  title: string;
  rows: readonly ChangeRow[];
  comparison: BillComparison;
}

function ChangeTable({ title, rows, comparison }: ChangeTableProps): ReactElement {
  return (
    <DenseTable
      label={title}
      columns={[
        { key: 'kind', title: 'Change' },
        { key: 'what', title: 'Where' },
        { key: 'before', title: `Revision ${comparison.from}` },
        { key: 'after', title: `Revision ${comparison.to}` },
      ]}
    >
      {rows.map(({ key, kind, part, what, before, after }) => (
        <tr key={key}>
          <td>
            <Flag tone={tones[kind]} glyph={glyphs[kind]}>
              {kind}
            </Flag>
          </td>
          <td>
            {part ? <Tag kind="part" code={part} /> : null} {what}
          </td>
          <td>{before}</td>
          <td>{after}</td>
        </tr>
      ))}
    </DenseTable>
  );
}
