import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { Link } from 'react-router-dom';

/**
 * A button that looks as every button does, without the library's: for the storefront and for what every first load has.
 */
const Look = styled('button')(({ theme }) => {
  const { tone } = theme.vars.palette;
  return {
    display: 'inline-flex',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 8,
    padding: '8px 18px',
    border: `1px solid ${tone.board}`,
    borderRadius: 3,
    background: 'transparent',
    color: tone.board,
    fontFamily: 'inherit',
    fontSize: '0.9375rem',
    fontWeight: 500,
    lineHeight: 1.5,
    textDecoration: 'none',
    cursor: 'pointer',
    '&:hover': { background: tone.boardSoft },
    '&[data-main]': { background: tone.board, color: tone.onBoard },
    '&[data-main]:hover': { filter: 'brightness(0.92)' },
    '&[data-large]': { padding: '12px 34px', fontSize: '1.125rem' },
    '&:disabled': {
      background: tone.line,
      borderColor: tone.line,
      color: tone.inkSoft,
      cursor: 'default',
      filter: 'none',
    },
  };
});

interface PressProps {
  children: ReactNode;
  onPress?: () => void;
  /** Goes there instead of doing something. */
  to?: string;
  /** The page's primary action: filled. */
  main?: boolean;
  large?: boolean;
  disabled?: boolean;
  type?: 'button' | 'submit';
}

export function Press({ children, onPress, to, main, large, disabled, type = 'button' }: PressProps): ReactElement {
  const look = { 'data-main': main ? '' : undefined, 'data-large': large ? '' : undefined };
  if (to !== undefined) {
    return (
      <Look as={Link} {...{ to }} {...look}>
        {children}
      </Look>
    );
  }
  return (
    <Look type={type} disabled={disabled} onClick={onPress} {...look}>
      {children}
    </Look>
  );
}
