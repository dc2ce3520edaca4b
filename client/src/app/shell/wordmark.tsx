import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';

const Mark = styled('span')(({ theme }) => ({
  display: 'inline-flex',
  alignItems: 'center',
  gap: 9,
  color: theme.vars.palette.tone.ink,
  fontFamily: theme.typography.h1.fontFamily,
  fontWeight: 600,
  fontSize: '1.25rem',
  letterSpacing: '0.01em',
  '& .spark': { stroke: theme.vars.palette.tone.copper },
}));

export function Wordmark(): ReactElement {
  return (
    <Mark>
      <svg
        width="22"
        height="22"
        viewBox="0 0 22 22"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.6"
        aria-hidden="true"
      >
        <path d="M8 1H3a2 2 0 0 0-2 2v16a2 2 0 0 0 2 2h16a2 2 0 0 0 2-2V3a2 2 0 0 0-2-2h-5" />
        <path
          className="spark"
          d="M11 15V1M7.5 12c0 2 1.5 4 3.5 4s3.5-2 3.5-4c0-1.8-1.5-2.6-3.5-5-2 2.4-3.5 3.2-3.5 5z"
        />
      </svg>
      <span>Emberlot</span>
    </Mark>
  );
}
