import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { DefinitionList } from '../../../components/definition-list';
import { Money, UnitCost } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { costQuery, type BillCost, type RevisionPlace } from '../api/bills';
import { unitOf } from './design-words';

/** What one costs today, over all levels. */
export function CostSheet({ place }: { place: RevisionPlace }): ReactElement {
  const cost = useQuery(costQuery(place));
  return (
    <Sheet title="What one costs today">
      {cost.isError ? <ErrorState error={cost.error} onRetry={() => void cost.refetch()} what="The cost" /> : null}
      {cost.isPending ? <LoadingState lines={3} label="Rolling the cost up" /> : null}
      {cost.data ? <Costs cost={cost.data} /> : null}
    </Sheet>
  );
}

const origins: Record<BillCost['lines'][number]['basis'], string> = {
  average: 'average',
  last: 'last delivery',
  bill: 'own bill',
  unknown: 'not known',
};

function Costs({ cost }: { cost: BillCost }): ReactElement {
  return (
    <>
      <DefinitionList
        items={[
          { term: 'Materials, at average cost', value: <Money value={cost.material} /> },
          { term: `Labour, ${cost.minutes} min on all levels`, value: <Money value={cost.labour} /> },
          { term: 'Together', value: <Money value={cost.total} /> },
        ]}
      />
      {cost.unknown.length > 0 ? (
        <p>
          <Flag tone="tape">counts too little</Flag> Nothing is known of the cost of{' '}
          {cost.unknown.map((part) => (
            <Tag key={part.code} kind="part" code={part.code} story={part.name} />
          ))}
        </p>
      ) : null}
      <details>
        <summary>Line by line</summary>
        <DefinitionList
          items={cost.lines.map((line) => ({
            term: `${line.position} ${line.part.code}, ${origins[line.basis]}`,
            value: (
              <>
                {line.unitCost === null ? null : (
                  <>
                    {line.taken} ×{' '}
                    <UnitCost cost={line.unitCost} currency={line.amount.currency} unit={unitOf(line.part.measure)} />{' '}
                    ={' '}
                  </>
                )}
                <Money value={line.amount} />
              </>
            ),
          }))}
        />
      </details>
    </>
  );
}
