import Button from '@mui/material/Button';
import type { ReactElement } from 'react';
import { Quantity } from '../../../components/figures';
import { Tag } from '../../../components/tag/tag';
import { useChooseSubAssembly, type Batch } from '../api/bench';
import { DenseTable } from './dense-table';

/** Made components: taken from the shelf, or built within the batch; to be switched while it is only planned. */
export function SubAssemblies({ batch }: { batch: Batch }): ReactElement {
  const choose = useChooseSubAssembly(batch.number);
  return (
    <DenseTable aria-label="Sub-assemblies">
      <thead>
        <tr>
          <th scope="col">Place</th>
          <th scope="col">Part</th>
          <th scope="col">What it is</th>
          <th scope="col" className="figure">
            Needed
          </th>
          <th scope="col">Where it comes from</th>
          <th scope="col">
            <span className="quiet">Change</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {batch.subAssemblies.map(({ path, part, required, fromShelf }) => (
          <tr key={path}>
            <td data-label="Place" className="quiet">
              {path}
            </td>
            <td>
              <Tag kind="part" code={part.code} story={part.name} />
            </td>
            <td>{part.name}</td>
            <td className="figure" data-label="Needed">
              <Quantity value={required} unit={part.measure} />
            </td>
            <td>{fromShelf ? 'from the shelf' : 'built within this batch'}</td>
            <td>
              {batch.status === 'planned' && part.traced !== 'single' ? (
                <Button
                  size="small"
                  disabled={choose.isPending}
                  aria-label={`${fromShelf ? 'Build' : 'Take from the shelf'} ${part.code}`}
                  onClick={() => choose.mutate({ path, fromShelf: !fromShelf, version: batch.version })}
                >
                  {fromShelf ? 'Build it here' : 'Take it from the shelf'}
                </Button>
              ) : null}
            </td>
          </tr>
        ))}
      </tbody>
    </DenseTable>
  );
}
