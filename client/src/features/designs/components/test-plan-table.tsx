import type { ReactElement } from 'react';
import { Caution } from '../../../components/caution';
import { Reading } from '../../../components/figures';
import type { Characteristic } from '../api/bills';
import { DenseTable, type DenseColumn } from './dense-table';
import { limitsInWords } from './design-words';

const columns: readonly DenseColumn[] = [
  { key: 'position', title: 'Step', figure: true },
  { key: 'name', title: 'What is looked at' },
  { key: 'limits', title: 'Sound if', figure: true },
  { key: 'target', title: 'Aim', figure: true },
  { key: 'condition', title: 'Taken at' },
];

/** What every unit is measured against. */
export function TestPlanTable({ plan }: { plan: readonly Characteristic[] }): ReactElement {
  return (
    <DenseTable label="Test plan" columns={columns}>
      {plan.map((entry) => (
        <tr key={entry.position}>
          <td className="figure">{entry.position}</td>
          <td className="what">
            {entry.name}
            {entry.caution ? (
              <div style={{ margin: '6px 0 4px', maxWidth: 480 }}>
                <Caution>{entry.caution}</Caution>
              </div>
            ) : null}
          </td>
          <td className="figure">{limitsInWords(entry)}</td>
          <td className="figure">
            {entry.target === null ? '–' : <Reading value={entry.target} unit={entry.unit ?? undefined} />}
          </td>
          <td className="quiet">{entry.condition}</td>
        </tr>
      ))}
    </DenseTable>
  );
}
