import Button from '@mui/material/Button';
import type { GridColDef } from '@mui/x-data-grid';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { column, quantityColumn, whenColumn } from '../../../components/grid/columns';
import { ServerGrid } from '../../../components/grid/server-grid';
import { useServerGrid } from '../../../components/grid/use-server-grid';
import { PageHeading } from '../../../components/page-heading';
import { QueueList } from '../../../components/queue-list';
import { Sheet } from '../../../components/sheet';
import { EmptyState } from '../../../components/states';
import { importKindsQuery, importsQuery, type ImportRun } from '../api/imports';
import { DocumentTag } from '../components/document-tag';
import { Loaded } from '../components/page-body';

const columns: readonly GridColDef<ImportRun>[] = [
  whenColumn('appliedAt', 'When', (run) => run.appliedAt, { hideable: false }),
  column('kind', 'What', (run) => run.title),
  column('fileName', 'File', (run) => run.fileName, { minWidth: 200 }),
  quantityColumn('rowCount', 'Lines', (run) => ({ value: String(run.rowCount) })),
  column('appliedBy', 'By', (run) => run.appliedBy, { sortable: false }),
  column(
    'document',
    'Document',
    (run) => (run.document ? <DocumentTag number={run.document} kind="opening" /> : null),
    {
      sortable: false,
      flex: 0,
      width: 140,
    },
  ),
];

export function Component(): ReactElement {
  const kinds = useQuery(importKindsQuery);
  const grid = useServerGrid({ name: 'imports', query: importsQuery, defaultSort: '-appliedAt' });
  return (
    <>
      <PageHeading
        title="Imports"
        lead="Tables from CSV files. A dry run shows every fault by its line; then a file is taken in whole, or not at all."
      />
      <Loaded query={kinds} what="The kinds of table">
        {({ items }) => (
          <QueueList
            label="Kinds of table"
            items={items.map((kind) => ({
              key: kind.kind,
              sentence: kind.title,
              because: kind.sentence,
              action: (
                <Button
                  component={Link}
                  to={`/shelf/imports/${kind.kind}`}
                  aria-label={`Take in ${kind.title.toLowerCase()}`}
                >
                  Take in
                </Button>
              ),
            }))}
          />
        )}
      </Loaded>
      <div style={{ marginTop: 28 }}>
        <Sheet title="Taken in so far" bare>
          <ServerGrid
            grid={grid}
            label="Files taken in"
            counted={['file', 'files']}
            rowId={(run) => run.id}
            columns={columns}
            searchLabel="File"
            empty={<EmptyState title="No file yet">Parts come first, then bills, then opening stock.</EmptyState>}
          />
        </Sheet>
      </div>
    </>
  );
}
