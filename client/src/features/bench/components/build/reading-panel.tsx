import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Caution } from '../../../../components/caution';
import type { Characteristic } from '../../api/bench';
import { allowedWords } from '../bench-words';
import type { Verdict } from './in-hand';
import { LimitBar } from './limit-bar';

export const Entry = styled('output')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    display: 'flex',
    alignItems: 'baseline',
    flexWrap: 'wrap',
    gap: '0 18px',
    minHeight: 104,
    padding: '8px 20px',
    border: `2px solid ${tone.board}`,
    borderRadius: 3,
    background: tone.sheet,
    '& b': { fontFamily: theme.typography.mono.fontFamily, fontSize: '4.25rem', fontWeight: 400, lineHeight: 1.25 },
    '& .unit': { fontSize: '1.75rem', color: tone.inkSoft },
    '& .verdict': { marginLeft: 'auto', fontSize: '2.125rem', fontWeight: 700, alignSelf: 'center' },
    '&[data-verdict="within"]': { borderColor: tone.sound, '& .verdict': { color: tone.sound } },
    '&[data-verdict="outside"]': { borderColor: tone.hot, '& .verdict': { color: tone.hot } },
  };
});

interface ReadingPanelProps {
  characteristic: Characteristic;
  place: string;
  typed: string;
  verdict: Verdict | undefined;
  /** What cannot be taken as it stands, or what was probably meant. */
  remark: string | undefined;
}

/** One characteristic in front: its limits, what is typed, and the verdict, to be read from two metres. */
export function ReadingPanel({ characteristic, place, typed, verdict, remark }: ReadingPanelProps): ReactElement {
  const { name, condition, unit, kind, caution } = characteristic;
  return (
    <>
      <p className="place">{[place, condition].filter(Boolean).join(' · ')}</p>
      <h1 tabIndex={-1}>{name}</h1>
      {kind === 'numeric' ? (
        <LimitBar characteristic={characteristic} value={typed} />
      ) : (
        <p className="place">Answer yes if it is so. Keys 1 for yes, 0 for no.</p>
      )}
      <Entry aria-label={`Reading, allowed ${allowedWords(characteristic)}`} data-verdict={verdict}>
        <b>{typed || '–'}</b>
        {unit ? <span className="unit">{unit}</span> : null}
        {verdict ? <span className="verdict">{verdict === 'within' ? '✓ within' : '✕ outside'}</span> : null}
      </Entry>
      {remark ? (
        <p role="alert" className="remark">
          {remark}
        </p>
      ) : null}
      {caution ? <Caution>{caution}</Caution> : null}
    </>
  );
}
