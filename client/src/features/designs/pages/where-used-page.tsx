import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { Quantity } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { EmptyState, ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { formatCount } from '../../../lib/format-quantity';
import { whereUsedQuery, type WhereUsed } from '../api/bills';
import { billAddress, kitAddress } from '../components/addresses';
import { DenseTable, type DenseColumn } from '../components/dense-table';
import { statusWords, unitOf } from '../components/design-words';
import { PartChooser } from '../components/part-chooser';

export function Component(): ReactElement {
  const [search, setSearch] = useSearchParams();
  const code = search.get('part') ?? '';
  return (
    <>
      <PageHeading title="Where used" lead="What a part goes into, at every level, and the kits it is packed in." />
      <PartChooser
        key={code}
        label="Part"
        hint="Type its code or a few letters of its name, or scan its tag."
        submitLabel="Look upward"
        initially={code}
        onChoose={(part) => setSearch({ part })}
      />
      {code === '' ? null : <Uses code={code} />}
    </>
  );
}

const columns: readonly DenseColumn[] = [
  { key: 'part', title: 'Goes into' },
  { key: 'what', title: 'What it is' },
  { key: 'revision', title: 'By' },
  { key: 'through', title: 'As' },
  { key: 'quantity', title: 'For one', figure: true },
];

const kitColumns: readonly DenseColumn[] = [
  { key: 'kit', title: 'Kit' },
  { key: 'what', title: 'What it is' },
  { key: 'through', title: 'As' },
  { key: 'bag', title: 'Bag' },
  { key: 'quantity', title: 'How many', figure: true },
];

function Uses({ code }: { code: string }): ReactElement {
  const used = useQuery(whereUsedQuery(code));
  if (used.isError)
    return <ErrorState error={used.error} onRetry={() => void used.refetch()} what="Where it is used" />;
  if (!used.data) return <LoadingState label="Looking upward" />;
  const { part, uses, kits } = used.data;
  if (uses.length + kits.length === 0) {
    return <EmptyState title={`${part.code} is in no bill and in no kit`}>{part.name} stands by itself.</EmptyState>;
  }
  return (
    <div style={{ display: 'grid', gridTemplateColumns: 'minmax(0, 1fr)', gap: 28 }}>
      {uses.length > 0 ? (
        <Sheet title={`${part.name}, upward`} bare aside={<span>{formatCount(uses.length, 'place')}</span>}>
          <UseRows uses={uses} />
        </Sheet>
      ) : null}
      {kits.length > 0 ? (
        <Sheet title="Packed in" bare>
          <DenseTable label="Kits" columns={kitColumns}>
            {kits.map((use) => (
              <tr key={`${use.part.code} ${use.through} ${use.bag}`}>
                <td>
                  <Tag kind="part" code={use.part.code} story={use.part.name} to={kitAddress(use.part.code)} />
                </td>
                <td className="what">{use.part.name}</td>
                <td>{use.through}</td>
                <td>{use.bag}</td>
                <td className="figure">
                  <Quantity value={use.quantity} />
                </td>
              </tr>
            ))}
          </DenseTable>
        </Sheet>
      ) : null}
    </div>
  );
}

function UseRows({ uses }: { uses: WhereUsed['uses'] }): ReactElement {
  return (
    <DenseTable label="What it goes into" columns={columns}>
      {uses.map((use) => (
        <tr key={`${use.path.join(' ')} ${use.revision} ${use.position}`}>
          <td>
            <span style={{ paddingLeft: (use.level - 1) * 26 }}>
              <Tag kind="part" code={use.part.code} story={use.part.name} to={billAddress(use.part.code)} />
            </span>
          </td>
          <td className="what">
            {use.part.name} {use.top ? <Flag tone="cool">goes into nothing further</Flag> : null}
          </td>
          <td>
            <Link to={billAddress(use.part.code, use.revision)}>
              revision {use.revision}, {statusWords[use.status]}
            </Link>
          </td>
          <td>
            {use.path.at(-2)}
            {use.alternate ? <span className="quiet"> in place of another</span> : null}
          </td>
          <td className="figure">
            <Quantity value={use.quantityPer} unit={unitOf(use.part.measure)} />
          </td>
        </tr>
      ))}
    </DenseTable>
  );
}
