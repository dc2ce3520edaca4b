import type { ReactElement } from 'react';
import { Quantity } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { Tag } from '../../../components/tag/tag';
import type { Batch, BatchLine } from '../api/bench';
import { DenseTable } from './dense-table';

function standing(line: BatchLine, open: boolean): ReactElement | null {
  if (!open) return null;
  if (line.missing !== '0') {
    return <Flag tone="hot">{line.missing} missing</Flag>;
  }
  if (Number(line.issued) >= Number(line.required)) return <Flag tone="sound">picked</Flag>;
  return <Flag tone="cool">claimed</Flag>;
}

/** What the batch takes from the shelf, and what of it is there. */
export function BatchLines({ batch }: { batch: Batch }): ReactElement {
  const open = batch.status !== 'done' && batch.status !== 'withdrawn';
  return (
    <DenseTable aria-label="Parts">
      <thead>
        <tr>
          <th scope="col">Place</th>
          <th scope="col">Part</th>
          <th scope="col">What it is</th>
          <th scope="col" className="figure">
            Needed
          </th>
          <th scope="col" className="figure">
            Picked
          </th>
          <th scope="col" className="figure">
            Claimed
          </th>
          <th scope="col">How it stands</th>
        </tr>
      </thead>
      <tbody>
        {batch.lines.map((line) => (
          <tr key={line.path}>
            <td data-label="Place" className="quiet">
              {line.path}
            </td>
            <td>
              <Tag kind="part" code={line.part.code} story={line.part.name} />
            </td>
            <td>
              {line.part.name}
              {line.alternates.length > 0 ? (
                <span className="quiet"> or {line.alternates.map(({ code }) => code).join(', ')}</span>
              ) : null}
            </td>
            <td className="figure" data-label="Needed">
              <Quantity value={line.required} unit={line.part.measure} />
            </td>
            <td className="figure" data-label="Picked">
              <Quantity value={line.issued} />
            </td>
            <td className="figure" data-label="Claimed">
              <Quantity value={line.claimed} />
            </td>
            <td>{standing(line, open)}</td>
          </tr>
        ))}
      </tbody>
    </DenseTable>
  );
}
