import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { useParams } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { useDocumentTitle } from '../../../lib/document-title';
import { formatReading } from '../../../lib/format-quantity';
import { formatDay } from '../../../lib/format-time';
import { numberWord } from '../../../lib/number-words';
import { publicUnitQuery, type PublicUnit } from '../api/unit-page';

const Page = styled('article')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    maxWidth: 560,
    display: 'grid',
    gap: 12,
    '& h1': { ...theme.typography.h1, margin: 0 },
    '& h2': { ...theme.typography.h2, margin: '14px 0 0' },
    '& p': { margin: 0 },
    '& .verdict': { ...theme.typography.h2, margin: 0 },
    '& .verdict[data-sound="true"]': { color: tone.sound },
    '& .verdict[data-sound="false"]': { color: tone.hot },
    '& table': { width: '100%', borderCollapse: 'collapse' },
    '& td, & th': { padding: '9px 0', borderBottom: `1px solid ${tone.line}`, textAlign: 'left', fontWeight: 400 },
    '& td': { textAlign: 'right', whiteSpace: 'nowrap', paddingLeft: 12 },
    '& .reading': { fontFamily: theme.typography.mono.fontFamily },
    '& .limits': { color: tone.inkSoft, fontSize: '0.8125rem' },
  };
});

type Reading = PublicUnit['readings'][number];

function limitWords({ lowerLimit, upperLimit, answer }: Reading): string {
  if (answer !== null) return 'yes';
  if (lowerLimit === null) return `≤ ${formatReading(upperLimit ?? '')}`;
  if (upperLimit === null) return `≥ ${formatReading(lowerLimit)}`;
  return `${formatReading(lowerLimit)} to ${formatReading(upperLimit)}`;
}

function verdictWords({ sound, readings }: PublicUnit): string {
  if (readings.length === 0) return 'Not measured yet';
  if (!sound) return '✕ Being seen to: it has no valid pass just now';
  return `✓ Passed all ${numberWord(readings.length)} ${readings.length === 1 ? 'reading' : 'readings'}`;
}

export function Component(): ReactElement {
  const { token = '' } = useParams();
  const unit = useQuery(publicUnitQuery(token));
  useDocumentTitle(unit.data?.name);
  return (
    <>
      <meta name="robots" content="noindex, nofollow" />
      {unit.isError && !unit.data ? (
        <ErrorState error={unit.error} onRetry={() => void unit.refetch()} what="This unit" />
      ) : null}
      {unit.data ? <UnitSheet unit={unit.data} /> : null}
      {!unit.data && !unit.isError ? <LoadingState lines={8} label="Loading the unit" /> : null}
    </>
  );
}

function UnitSheet({ unit }: { unit: PublicUnit }): ReactElement {
  const warranty = unit.warrantyUntil ? ` Under warranty until ${formatDay(unit.warrantyUntil)}.` : '';
  return (
    <Page>
      <div>
        <Tag kind="unit" code={unit.serial} to={null} size="big" />
      </div>
      <h1 tabIndex={-1}>
        {unit.name}, built in week {unit.builtWeek} of {unit.builtYear}
      </h1>
      <p className="verdict" data-sound={unit.readings.length > 0 ? unit.sound : undefined}>
        {verdictWords(unit)}
      </p>
      <p>
        Revision {unit.revision}, batch of {numberWord(unit.batchSize)}.{warranty}
      </p>
      <Caution>
        <p>
          Hot within seconds, and for minutes after. Solder in moving air. Keep the lithium cells closed and dry, and
          charge them only with their own lead.
        </p>
        {unit.cautions.map((caution) => (
          <p key={caution}>{caution}</p>
        ))}
      </Caution>
      {unit.readings.length > 0 ? (
        <>
          <h2>How it measured</h2>
          {unit.measuredOn ? <p className="limits">On {formatDay(unit.measuredOn)}, each against its limits.</p> : null}
          <table aria-label="How it measured">
            <tbody>
              {unit.readings.map((reading) => (
                <tr key={reading.name}>
                  <th scope="row">{reading.name}</th>
                  <td className="reading">
                    {reading.within ? '' : '✕ '}
                    {reading.reading === null
                      ? reading.answer
                        ? 'yes'
                        : 'no'
                      : formatReading(reading.reading, reading.unit ?? undefined)}
                  </td>
                  <td className="limits">{limitWords(reading)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        </>
      ) : null}
    </Page>
  );
}
