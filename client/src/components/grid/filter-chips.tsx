import Menu from '@mui/material/Menu';
import MenuItem from '@mui/material/MenuItem';
import { styled } from '@mui/material/styles';
import { useEffect, useRef, useState, type ReactElement } from 'react';
import type { GridFilter, ServerGridModel } from './use-server-grid';

const Chip = styled('button')(({ theme }) => ({
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  padding: '4px 10px',
  minHeight: 32,
  background: theme.vars.palette.tone.sheet,
  color: theme.vars.palette.tone.ink,
  font: 'inherit',
  fontSize: '0.8125rem',
  cursor: 'pointer',
  '&[data-on]': {
    borderColor: theme.vars.palette.tone.board,
    background: theme.vars.palette.tone.boardSoft,
    fontWeight: 500,
  },
}));

const Search = styled('input')(({ theme }) => ({
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  padding: '4px 10px',
  minHeight: 32,
  width: 220,
  background: theme.vars.palette.tone.sheet,
  color: theme.vars.palette.tone.ink,
  font: 'inherit',
  fontSize: '0.8125rem',
  '&::placeholder': { color: theme.vars.palette.tone.inkSoft, opacity: 1 },
}));

const DayChip = styled('label')(({ theme }) => ({
  display: 'inline-flex',
  alignItems: 'center',
  gap: 8,
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  padding: '0 10px',
  minHeight: 32,
  background: theme.vars.palette.tone.sheet,
  fontSize: '0.8125rem',
  '&[data-on]': { borderColor: theme.vars.palette.tone.board, background: theme.vars.palette.tone.boardSoft },
  '& input': { border: 0, background: 'none', color: 'inherit', font: 'inherit', padding: 0 },
}));

interface FilterChipsProps<Row> {
  grid: ServerGridModel<Row>;
  searchLabel?: string;
}

export function FilterChips<Row>({ grid, searchLabel = 'Search this list' }: FilterChipsProps<Row>): ReactElement {
  return (
    <>
      <SearchBox value={grid.state.q} onChange={(q) => grid.change({ q })} label={searchLabel} />
      {grid.filters.map((filter) => (
        <FilterChip
          key={filter.field}
          filter={filter}
          value={grid.state.filters[filter.field]}
          onChange={(value) => grid.setFilter(filter.field, value)}
        />
      ))}
      {grid.narrowed ? (
        <Chip type="button" onClick={grid.clearFilters}>
          Clear all
        </Chip>
      ) : null}
    </>
  );
}

const typingPause = 250;

function SearchBox({
  value,
  onChange,
  label,
}: {
  value: string;
  onChange: (q: string) => void;
  label: string;
}): ReactElement {
  const [text, setText] = useState(value);
  const [seen, setSeen] = useState(value);
  const [asked, setAsked] = useState<readonly string[]>([value]);
  // The address follows a moment later. What was asked for from here is old by then and must not replace what has been
  // typed since; anything else came from outside (a link, the way back) and stands in the field.
  if (value !== seen) {
    setSeen(value);
    if (!asked.includes(value)) setText(value);
    if (value === asked.at(-1) || !asked.includes(value)) setAsked([value]);
  }
  const pending = useRef<ReturnType<typeof setTimeout> | undefined>(undefined);
  useEffect(() => () => clearTimeout(pending.current), []);
  const ask = (q: string): void => {
    clearTimeout(pending.current);
    setAsked((before) => [...before, q.trim()]);
    onChange(q.trim());
  };
  return (
    <Search
      type="search"
      value={text}
      placeholder={label}
      aria-label={label}
      onChange={({ target }) => {
        setText(target.value);
        clearTimeout(pending.current);
        pending.current = setTimeout(() => ask(target.value), typingPause);
      }}
      onKeyDown={(event) => {
        if (event.key === 'Enter') ask(text);
      }}
    />
  );
}

interface FilterChipProps {
  filter: GridFilter;
  value: string | undefined;
  onChange: (value: string | undefined) => void;
}

function FilterChip({ filter, value, onChange }: FilterChipProps): ReactElement {
  const [anchor, setAnchor] = useState<HTMLElement | null>(null);
  if (filter.kind === 'day') {
    return (
      <DayChip data-on={value ? '' : undefined}>
        {filter.label}
        <input type="date" value={value ?? ''} onChange={({ target }) => onChange(target.value || undefined)} />
      </DayChip>
    );
  }
  if (!filter.options) {
    return (
      <Chip
        type="button"
        aria-pressed={value !== undefined}
        data-on={value ? '' : undefined}
        onClick={() => onChange(value ? undefined : 'true')}
      >
        {filter.label}
        {value ? <span aria-hidden="true"> ✕</span> : null}
      </Chip>
    );
  }
  const chosen = filter.options.find((option) => option.value === value);
  const choose = (next: string | undefined): void => {
    setAnchor(null);
    onChange(next);
  };
  return (
    <>
      <Chip
        type="button"
        aria-haspopup="menu"
        aria-expanded={anchor !== null}
        data-on={chosen ? '' : undefined}
        onClick={(event) => setAnchor(event.currentTarget)}
      >
        {filter.label}: {chosen?.label ?? value ?? 'any'}
      </Chip>
      <Menu open={anchor !== null} anchorEl={anchor} onClose={() => setAnchor(null)}>
        <MenuItem selected={value === undefined} onClick={() => choose(undefined)}>
          any
        </MenuItem>
        {filter.options.map((option) => (
          <MenuItem key={option.value} selected={option.value === value} onClick={() => choose(option.value)}>
            {option.label}
          </MenuItem>
        ))}
      </Menu>
    </>
  );
}
