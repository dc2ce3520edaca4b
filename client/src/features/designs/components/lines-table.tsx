import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Quantity } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { Tag } from '../../../components/tag/tag';
import type { BillLine } from '../api/bills';
import { billAddress } from './addresses';
import { DenseTable, type DenseColumn } from './dense-table';
import { unitOf } from './design-words';

const columns: readonly DenseColumn[] = [
  { key: 'position', title: 'Position', figure: true },
  { key: 'part', title: 'Part' },
  { key: 'what', title: 'What it is' },
  { key: 'quantity', title: 'For one', figure: true },
  { key: 'scrap', title: 'Scrap', figure: true },
  { key: 'marks', title: 'Marks' },
  { key: 'alternates', title: 'May be replaced by' },
];

/** The lines of one bill, by position. */
export function LinesTable({ lines }: { lines: readonly BillLine[] }): ReactElement {
  return (
    <DenseTable label="Lines" columns={columns}>
      {lines.map((line) => (
        <tr key={line.position}>
          <td className="figure">{line.position}</td>
          <td>
            <Tag kind="part" code={line.part.code} story={line.part.name} />
          </td>
          <td className="what">
            {line.part.name}
            {line.madeBy === null ? null : (
              <>
                {' '}
                <Link to={billAddress(line.part.code)}>revision {line.madeBy}</Link>
              </>
            )}
            {line.part.retired ? (
              <>
                {' '}
                <Flag tone="hot">retired</Flag>
              </>
            ) : null}
            {line.note ? <div className="quiet">{line.note}</div> : null}
          </td>
          <td className="figure">
            <Quantity value={line.quantityPer} unit={unitOf(line.part.measure)} />
          </td>
          <td className="figure quiet">{line.scrapPercent === '0' ? '–' : `${line.scrapPercent} %`}</td>
          <td>{line.marks}</td>
          <td>
            {line.alternates.map((part) => (
              <span key={part.code} style={{ marginRight: 8 }}>
                <Tag kind="part" code={part.code} story={part.name} />
              </span>
            ))}
          </td>
        </tr>
      ))}
    </DenseTable>
  );
}
