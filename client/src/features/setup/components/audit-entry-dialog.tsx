import Button from '@mui/material/Button';
import Dialog from '@mui/material/Dialog';
import DialogActions from '@mui/material/DialogActions';
import DialogContent from '@mui/material/DialogContent';
import DialogTitle from '@mui/material/DialogTitle';
import Table from '@mui/material/Table';
import TableBody from '@mui/material/TableBody';
import TableCell from '@mui/material/TableCell';
import TableHead from '@mui/material/TableHead';
import TableRow from '@mui/material/TableRow';
import Typography from '@mui/material/Typography';
import { useId, type ReactElement } from 'react';
import { formatInstant } from '../../../lib/format-time';
import type { AuditEntry } from '../api/audit';
import { actionWords, changesOf, subjectWords } from './audit-words';

export function AuditEntryDialog({ entry, onClose }: { entry: AuditEntry; onClose: () => void }): ReactElement {
  const titleId = useId();
  return (
    <Dialog open onClose={onClose} aria-labelledby={titleId} maxWidth="md" fullWidth>
      <DialogTitle id={titleId}>
        {actionWords(entry.action)}, {subjectWords(entry)}
      </DialogTitle>
      <DialogContent>
        <Typography color="text.secondary" sx={{ mb: 1 }}>
          {formatInstant(entry.recordedAt)}
        </Typography>
        <Table size="small">
          <TableHead>
            <TableRow>
              <TableCell>Field</TableCell>
              <TableCell>Before</TableCell>
              <TableCell>After</TableCell>
            </TableRow>
          </TableHead>
          <TableBody>
            {changesOf(entry).map(({ field, before, after }) => (
              <TableRow key={field}>
                <TableCell component="th" scope="row">
                  {field}
                </TableCell>
                <TableCell sx={{ overflowWrap: 'anywhere' }}>{before}</TableCell>
                <TableCell sx={{ overflowWrap: 'anywhere' }}>{after}</TableCell>
              </TableRow>
            ))}
          </TableBody>
        </Table>
      </DialogContent>
      <DialogActions>
        <Button onClick={onClose}>Close</Button>
      </DialogActions>
    </Dialog>
  );
}
