import Button from '@mui/material/Button';
import Checkbox from '@mui/material/Checkbox';
import FormControlLabel from '@mui/material/FormControlLabel';
import FormGroup from '@mui/material/FormGroup';
import Popover from '@mui/material/Popover';
import { useState, type ReactElement } from 'react';
import { readStored, writeStored } from '../../lib/stored';

interface Column {
  field: string;
  headerName?: string;
  hideable?: boolean;
}

export interface ColumnChoice {
  /** `false` hides a field. */
  visible: Record<string, boolean>;
  columns: readonly Column[];
  set: (field: string, shown: boolean) => void;
}

/** Which columns a list shows; remembered on this device. */
export function useColumnChoice(
  name: string,
  columns: readonly Column[],
  hiddenAtFirst: readonly string[] = [],
): ColumnChoice {
  const key = `columns:${name}`;
  const [visible, setVisible] = useState<Record<string, boolean>>(() => ({
    ...Object.fromEntries(hiddenAtFirst.map((field) => [field, false])),
    ...(readStored('local', key) as Record<string, boolean> | undefined),
  }));
  return {
    visible,
    columns,
    set: (field, shown) => {
      const next = { ...visible, [field]: shown };
      setVisible(next);
      writeStored('local', key, next);
    },
  };
}

export function ColumnChoiceButton({ choice }: { choice: ColumnChoice }): ReactElement {
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  const hideable = choice.columns.filter(({ hideable, headerName }) => hideable !== false && headerName);
  return (
    <>
      <Button
        size="small"
        variant="text"
        onClick={(event) => setAnchor(event.currentTarget)}
        aria-haspopup="dialog"
        aria-expanded={anchor !== null}
        sx={{ px: 0.5 }}
      >
        Columns
      </Button>
      <Popover
        open={anchor !== null}
        anchorEl={anchor}
        onClose={() => setAnchor(null)}
        anchorOrigin={{ vertical: 'bottom', horizontal: 'left' }}
        slotProps={{ paper: { role: 'dialog', 'aria-label': 'Columns to show', sx: { p: 2 } } }}
      >
        <FormGroup>
          {hideable.map(({ field, headerName }) => (
            <FormControlLabel
              key={field}
              label={headerName}
              control={
                <Checkbox
                  size="small"
                  checked={choice.visible[field] !== false}
                  onChange={(_, shown) => choice.set(field, shown)}
                />
              }
            />
          ))}
        </FormGroup>
      </Popover>
    </>
  );
}
