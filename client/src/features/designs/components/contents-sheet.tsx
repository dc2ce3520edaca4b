import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Quantity } from '../../../components/figures';
import { Sheet } from '../../../components/sheet';
import { Tag } from '../../../components/tag/tag';
import { contentsQuery, type Contents } from '../api/kits';
import { editKitAddress } from './addresses';
import { DenseTable, type DenseColumn } from './dense-table';
import { unitOf } from './design-words';

const columns: readonly DenseColumn[] = [
  { key: 'part', title: 'Part', width: 220 },
  { key: 'what', title: 'What it is' },
  { key: 'quantity', title: 'How many', figure: true, width: 120 },
  { key: 'weight', title: 'Weighs', figure: true, width: 130 },
];

/** What is packed when this is sold as a kit; nothing for a part that is none. */
export function ContentsSheet({ code, editable }: { code: string; editable: boolean }): ReactElement | null {
  const contents = useQuery(contentsQuery(code)).data;
  if (!contents || contents.lines.length === 0) return null;
  return (
    <Sheet
      title="Contents as a kit"
      bare
      aside={editable ? <Link to={editKitAddress(code)}>Edit the contents</Link> : null}
    >
      <ContentsByBag contents={contents} />
    </Sheet>
  );
}

export function ContentsByBag({ contents }: { contents: Contents }): ReactElement {
  return (
    <>
      {contents.bags.map(({ bag, weightG, unweighed }) => (
        <div key={bag} style={{ marginBottom: 16 }}>
          <p style={{ margin: '0 0 6px' }}>
            Bag {bag}, <Weight grams={weightG} unweighed={unweighed} />
          </p>
          <DenseTable label={`Bag ${bag}`} columns={columns}>
            {contents.lines
              .filter((line) => line.bag === bag)
              .map((line) => (
                <tr key={line.position}>
                  <td>
                    <Tag kind="part" code={line.part.code} story={line.part.name} />
                  </td>
                  <td className="what">
                    {line.part.name} <span className="quiet">{line.made ? 'made' : 'bought'}</span>
                  </td>
                  <td className="figure">
                    <Quantity value={line.quantity} unit={unitOf(line.part.measure)} />
                  </td>
                  <td className="figure">
                    {line.weightG === null ? 'not known' : <Quantity value={line.weightG} unit="g" />}
                  </td>
                </tr>
              ))}
          </DenseTable>
        </div>
      ))}
      <p style={{ margin: 0 }}>
        Everything together: <Weight grams={contents.weightG} unweighed={contents.unweighed} />
      </p>
    </>
  );
}

function Weight({ grams, unweighed }: { grams: string; unweighed: readonly string[] }): ReactElement {
  return (
    <>
      <Quantity value={grams} unit="g" /> expected
      {unweighed.length > 0 ? `, without ${unweighed.join(', ')}, whose weight is not known` : null}
    </>
  );
}
