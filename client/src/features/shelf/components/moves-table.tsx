import type { ReactElement } from 'react';
import { DenseTable } from '../../../components/dense-table';
import { Money, When } from '../../../components/figures';
import { Tag } from '../../../components/tag/tag';
import type { Move } from '../api/stock';
import { DocumentTag } from './document-tag';
import { reasonWords } from './shelf-words';
import { Amount } from './amount';

interface MovesTableProps {
  moves: readonly Move[];
  /** What the page is about already needs no column. */
  about: 'part' | 'lot';
}

/** The latest moves of one thing; the whole ledger stands behind the link beside the heading. */
export function MovesTable({ moves, about }: MovesTableProps): ReactElement {
  if (moves.length === 0) return <p>Nothing has moved yet.</p>;
  const money = moves.some(({ value }) => value !== undefined);
  const columns = [
    { key: 'when', title: 'When' },
    { key: 'what', title: 'What' },
    { key: 'quantity', title: 'Quantity', figure: true },
    ...(about === 'part' ? [{ key: 'lot', title: 'Lot' }] : []),
    { key: 'bin', title: 'Bin' },
    ...(money ? [{ key: 'value', title: 'Value', figure: true }] : []),
    { key: 'document', title: 'Document' },
  ];
  return (
    <DenseTable label="Moves" columns={columns}>
      {moves.map((move) => (
        <tr key={move.id}>
          <td>
            <When instant={move.occurredAt} />
          </td>
          <td className="what">
            {reasonWords[move.reason] ?? move.reason}
            {move.person ? <span className="quiet"> by {move.person}</span> : null}
          </td>
          <td className="figure">
            <Amount value={move.quantity} measure={move.measure} />
          </td>
          {about === 'part' ? (
            <td>
              <Tag kind="lot" code={move.lot} />
            </td>
          ) : null}
          <td>
            <Tag kind="bin" code={move.bin} />
          </td>
          {money ? <td className="figure">{move.value ? <Money value={move.value} /> : null}</td> : null}
          <td>
            <DocumentTag number={move.document} kind={move.documentKind} note={move.note} />
          </td>
        </tr>
      ))}
    </DenseTable>
  );
}
