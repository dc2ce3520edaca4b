import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import { useQuery } from '@tanstack/react-query';
import { useState, type ReactElement } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { usePerson } from '../../../api/session';
import { ConfirmDialog } from '../../../components/confirm-dialog';
import { DenseTable } from '../../../components/dense-table';
import { Flag } from '../../../components/flag';
import { Form } from '../../../components/form/form';
import { useDraftForm } from '../../../components/form/use-draft-form';
import { PageHeading } from '../../../components/page-heading';
import { EmptyState } from '../../../components/states';
import { Tag } from '../../../components/tag/tag';
import { TagActions } from '../../../components/tag/tag-actions';
import { formatCount } from '../../../lib/format-quantity';
import { formatDayShort, shopDay } from '../../../lib/format-time';
import { binQuery, useEditBin, useRetireBin, type Bin, type BinInput } from '../api/bins';
import { adjustAddress, transferAddress } from '../components/addresses';
import { BinFields } from '../components/bin-fields';
import { LotStatusFlag } from '../components/lot-status-flag';
import { Loaded } from '../components/page-body';
import { Amount } from '../components/amount';

export function Component(): ReactElement {
  const { code = '' } = useParams();
  return (
    <Loaded query={useQuery(binQuery(code))} what="The bin">
      {(bin) => <BinStory bin={bin} />}
    </Loaded>
  );
}

function BinStory({ bin }: { bin: Bin }): ReactElement {
  const role = usePerson()?.role;
  return (
    <>
      <PageHeading
        title={bin.name ? `Bin ${bin.code}, ${bin.name}` : `Bin ${bin.code}`}
        lead={bin.contents.length === 0 ? 'Nothing lies in it.' : `${formatCount(bin.contents.length, 'thing')} in it.`}
        tags={
          <>
            <Tag kind="bin" code={bin.code} size="big" to={null} />
            {bin.quarantine ? <Flag tone="tape">quarantine</Flag> : null}
            {bin.retired ? <Flag tone="cool">out of use</Flag> : null}
            <TagActions kind="bin" code={bin.code} story={bin.name || 'Bin'} />
          </>
        }
        actions={role === 'owner' ? <Acts bin={bin} /> : null}
      />
      {bin.contents.length === 0 ? (
        <EmptyState title="Nothing lies in this bin">
          What is received or moved here will stand on this page.
        </EmptyState>
      ) : (
        <Contents bin={bin} mayAct={role === 'owner' || role === 'assembler'} />
      )}
    </>
  );
}

function Contents({ bin, mayAct }: { bin: Bin; mayAct: boolean }): ReactElement {
  const [today] = useState(() => shopDay(Date.now()));
  const columns = [
    { key: 'part', title: 'Part' },
    { key: 'quantity', title: 'Quantity', figure: true },
    ...(mayAct ? [{ key: 'act', title: '' }] : []),
    { key: 'lot', title: 'Lot' },
    { key: 'status', title: 'May be used' },
    { key: 'expires', title: 'Expires' },
  ];
  return (
    <DenseTable label={`What lies in ${bin.code}`} columns={columns}>
      {bin.contents.map((content) => {
        const place = { part: content.part, lot: content.lot, bin: bin.code };
        return (
          <tr key={content.lot}>
            <td>
              <Tag kind="part" code={content.part} story={content.name} />
              <div className="quiet">{content.name}</div>
            </td>
            <td className="figure">
              <Amount value={content.quantity} measure={content.measure} />
            </td>
            {mayAct ? (
              <td>
                <Button
                  size="small"
                  variant="text"
                  component={Link}
                  to={adjustAddress({ ...place, reason: 'counted' })}
                  aria-label={`Count ${content.part}`}
                >
                  Count
                </Button>
                <Button
                  size="small"
                  variant="text"
                  component={Link}
                  to={transferAddress(place)}
                  aria-label={`Move ${content.part}`}
                >
                  Move
                </Button>
              </td>
            ) : null}
            <td>
              <Tag kind="lot" code={content.lot} />
            </td>
            <td>
              <LotStatusFlag
                status={content.lotStatus}
                expired={content.expiresOn !== null && content.expiresOn < today}
              />
            </td>
            <td>{content.expiresOn ? formatDayShort(content.expiresOn) : ''}</td>
          </tr>
        );
      })}
    </DenseTable>
  );
}

function Acts({ bin }: { bin: Bin }): ReactElement {
  const [asking, setAsking] = useState<'edit' | 'retire'>();
  const retire = useRetireBin(bin.code);
  const close = (): void => setAsking(undefined);
  return (
    <>
      <Button onClick={() => setAsking('edit')}>Edit</Button>
      <Button onClick={() => setAsking('retire')}>{bin.retired ? 'Bring back' : 'Put out of use'}</Button>
      {asking === 'edit' ? <EditDialog bin={bin} onClose={close} /> : null}
      <ConfirmDialog
        open={asking === 'retire'}
        title={bin.retired ? `Bring bin ${bin.code} back?` : `Put bin ${bin.code} out of use?`}
        confirmLabel={bin.retired ? 'Bring it back' : 'Put it out of use'}
        onConfirm={() => retire.mutateAsync({ version: bin.version, retire: !bin.retired })}
        onClose={close}
      >
        {bin.retired ? 'Things can be put into it again.' : 'Nothing can be put into it any more. It must be empty.'}
      </ConfirmDialog>
    </>
  );
}

function EditDialog({ bin, onClose }: { bin: Bin; onClose: () => void }): ReactElement {
  const edit = useEditBin(bin.code);
  const navigate = useNavigate();
  const form = useDraftForm<BinInput>({
    name: `bin:${bin.code}`,
    defaultValues: { code: bin.code, name: bin.name, quarantine: bin.quarantine },
  });
  const send = async (values: BinInput): Promise<void> => {
    const after = await edit.mutateAsync({ ...values, version: bin.version });
    onClose();
    if (after.code !== bin.code) await navigate(`/shelf/bins/${encodeURIComponent(after.code)}`, { replace: true });
  };
  return (
    <Dialog open onClose={onClose} aria-labelledby="edit-bin" maxWidth="xs" fullWidth>
      <DialogTitle id="edit-bin">Edit bin {bin.code}</DialogTitle>
      <DialogContent>
        <Form form={form} onSubmit={send} onCancel={onClose} submitLabel="Keep these changes">
          <BinFields />
        </Form>
      </DialogContent>
    </Dialog>
  );
}
