import Button from '@mui/material/Button';
import Box from '@mui/material/Box';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useParams } from 'react-router-dom';
import { Quantity, When } from '../../../components/figures';
import { Flag } from '../../../components/flag';
import { PageHeading } from '../../../components/page-heading';
import { Sheet } from '../../../components/sheet';
import { ErrorState, LoadingState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { unitQuery, type TestRun, type Unit } from '../api/bench';
import { buildAddress, faultAddress } from '../components/addresses';
import { allowedWords, readingWords, unitStateWords } from '../components/bench-words';
import { DenseTable } from '../components/dense-table';
import { ScrapDialog } from '../components/scrap-dialog';

export function Component(): ReactElement {
  const { serial = '' } = useParams();
  const unit = useQuery(unitQuery(serial));
  if (unit.isError && !unit.data) {
    return <ErrorState error={unit.error} onRetry={() => void unit.refetch()} what={`Unit ${serial}`} />;
  }
  if (!unit.data) return <LoadingState lines={10} label={`Loading unit ${serial}`} />;
  return <UnitView unit={unit.data} />;
}

function UnitView({ unit }: { unit: Unit }): ReactElement {
  return (
    <>
      <PageHeading
        tags={
          <>
            <Tag kind="unit" code={unit.serial} size="big" to={null} />
            <Tag kind="batch" code={unit.batch} />
          </>
        }
        title={unit.partName}
        documentTitle={`Unit ${unit.serial}`}
        lead={
          <>
            {unit.sound ? <Flag tone="sound">sound</Flag> : <Flag tone="hot">no valid pass</Flag>} Revision{' '}
            {unit.revision}, {unit.place} of {unit.batchSize}, {unitStateWords[unit.state]}
            {unit.bin ? ` in ${unit.bin}` : ''}.{unit.scrapReason ? ` Scrapped: ${unit.scrapReason}.` : ''}
          </>
        }
        actions={<Acts unit={unit} />}
      />
      <Box sx={{ display: 'grid', gap: 3 }}>
        <AsBuilt unit={unit} />
        {unit.runs.toReversed().map((run) => (
          <Run key={run.run} run={run} />
        ))}
        <Faults unit={unit} />
        <Steps unit={unit} />
      </Box>
    </>
  );
}

function Acts({ unit }: { unit: Unit }): ReactElement {
  const [scrapping, setScrapping] = useState(false);
  const { serial } = unit;
  return (
    <>
      {unit.state === 'under_way' ? <Button onClick={() => setScrapping(true)}>Scrap</Button> : null}
      <Button component={Link} to={unit.page} target="_blank">
        Public page
      </Button>
      <Button component="a" href={`/api/units/${encodeURIComponent(serial)}/label`} target="_blank" rel="noopener">
        Print label
      </Button>
      {unit.state === 'under_way' ? (
        <Button variant="contained" component={Link} to={buildAddress(unit.batch, serial)}>
          Bring to the bench
        </Button>
      ) : null}
      {scrapping ? <ScrapDialog serial={serial} onClose={() => setScrapping(false)} /> : null}
    </>
  );
}

function AsBuilt({ unit }: { unit: Unit }): ReactElement {
  return (
    <Sheet title="What is in it">
      {unit.asBuilt.length === 0 ? (
        <p>Recorded when the unit is finished, or as lots are scanned to it.</p>
      ) : (
        <DenseTable aria-label="What is in it">
          <thead>
            <tr>
              <th scope="col">Part</th>
              <th scope="col">What it is</th>
              <th scope="col">Lot</th>
              <th scope="col">How sure</th>
              <th scope="col" className="figure">
                Quantity
              </th>
            </tr>
          </thead>
          <tbody>
            {unit.asBuilt.map((part) => (
              <tr key={`${part.path} ${part.part} ${part.lot ?? ''}`}>
                <td>
                  <Tag kind="part" code={part.part} story={part.partName} />
                </td>
                <td>{part.partName}</td>
                <td>{part.lot ? <Tag kind="lot" code={part.lot} story={part.supplier ?? undefined} /> : 'by count'}</td>
                <td>{part.exact ? 'scanned to it' : 'one of the lots of its batch'}</td>
                <td className="figure">
                  <Quantity value={part.quantity} unit={part.measure} />
                </td>
              </tr>
            ))}
          </tbody>
        </DenseTable>
      )}
    </Sheet>
  );
}

function Run({ run }: { run: TestRun }): ReactElement {
  const verdict =
    run.verdict === 'pass' ? (
      <Flag tone="sound">passed</Flag>
    ) : run.verdict === 'fail' ? (
      <Flag tone="hot">failed</Flag>
    ) : (
      <Flag tone="cool">under way</Flag>
    );
  return (
    <Sheet title={<>Run {run.run}</>} aside={run.measuredAt ? <When instant={run.measuredAt} /> : undefined}>
      <p>
        {verdict} {run.voidedAt ? `Void: ${run.voidReason}.` : ''}
      </p>
      <DenseTable aria-label={`Readings of run ${run.run}`}>
        <tbody>
          {run.readings.map((reading) => (
            <tr key={`${reading.position} ${reading.measuredAt} ${reading.reading ?? ''}`}>
              <td>{reading.name}</td>
              <td className="figure">
                <code>{readingWords(reading)}</code>
              </td>
              <td className="quiet">{allowedWords(reading)}</td>
              <td>
                {reading.replaced ? (
                  'replaced by a later one'
                ) : reading.verdict === 'within' ? (
                  <Flag tone="sound">within</Flag>
                ) : (
                  <Flag tone="hot">outside</Flag>
                )}
              </td>
              <td className="quiet">{reading.recordedBy}</td>
            </tr>
          ))}
        </tbody>
      </DenseTable>
    </Sheet>
  );
}

function Faults({ unit }: { unit: Unit }): ReactElement | null {
  if (unit.faults.length === 0) return null;
  return (
    <Sheet title="Faults">
      <ul>
        {unit.faults.map((fault) => (
          <li key={fault.number}>
            <Link to={faultAddress(fault.number)}>{fault.number}</Link> {fault.what}{' '}
            {fault.outcome === null ? <Flag tone="tape">open</Flag> : null}
            {fault.action ? ` ${fault.cause ? `${fault.cause}. ` : ''}${fault.action}.` : ''}
          </li>
        ))}
      </ul>
    </Sheet>
  );
}

function Steps({ unit }: { unit: Unit }): ReactElement {
  return (
    <Sheet title="Steps">
      <ol>
        {unit.steps.map((step) => (
          <li key={step.position}>
            {step.title}
            {step.doneAt ? (
              <>
                , done <When instant={step.doneAt} /> {step.doneBy ? `by ${step.doneBy}` : ''}
              </>
            ) : (
              ', not done yet'
            )}
          </li>
        ))}
      </ol>
    </Sheet>
  );
}
