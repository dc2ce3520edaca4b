import { styled } from '@mui/material/styles';
import type { KeyboardEvent, ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { useHoverCard } from '../hover-card';
import { copyText } from './copy-text';
import { openPrint } from './open-print';
import { VisuallyHidden } from '../visually-hidden';
import { hasOutline, tagAddress, tagEdges, tagWords, type TagKind } from './tag-kinds';

export type TagSize = 'normal' | 'big' | 'huge';

export interface TagProps {
  kind: TagKind;
  code: string;
  /** One line about the thing, shown on hover and focus. */
  story?: string;
  /** Another address than the thing's own; `null` where there is nowhere to go, as on a public page. */
  to?: string | null;
  size?: TagSize;
}

const pixels: Record<TagSize, number> = { normal: 13, big: 16.25, huge: 22 };

const Body = styled('span')(({ theme }) => ({
  display: 'inline-flex',
  height: '2em',
  maxWidth: '100%',
  verticalAlign: '-0.54em',
  color: theme.vars.palette.tone.ink,
  fontFamily: theme.typography.mono.fontFamily,
  fontWeight: 500,
  whiteSpace: 'nowrap',
  textDecoration: 'none',
  borderRadius: 3,
  '& svg': {
    display: 'block',
    flex: 'none',
    width: '1.0769em',
    height: '2em',
    fill: theme.vars.palette.tone.sheet,
    stroke: 'currentColor',
    '& path': { vectorEffect: 'non-scaling-stroke' },
  },
  '& b': {
    display: 'flex',
    alignItems: 'center',
    minWidth: 0,
    fontWeight: 500,
    border: '1px solid currentColor',
    borderLeft: 0,
    borderRadius: '0 3px 3px 0',
    padding: '0 0.62em 0 0.38em',
    background: theme.vars.palette.tone.sheet,
    overflow: 'hidden',
    textOverflow: 'ellipsis',
  },
  '& b[data-plain]': {
    borderLeft: '1px solid currentColor',
    borderColor: theme.vars.palette.tone.edge,
    borderRadius: 3,
    paddingLeft: '0.62em',
  },
  'a&:hover': { color: theme.vars.palette.tone.board },
}));

function Drawing({ kind, code }: Pick<TagProps, 'kind' | 'code'>): ReactElement {
  const name = <VisuallyHidden>{tagWords[kind]} </VisuallyHidden>;
  if (!hasOutline(kind)) {
    return (
      <b data-plain="">
        {name}
        {code}
      </b>
    );
  }
  return (
    <>
      <svg viewBox="0 0 14 26" aria-hidden="true">
        <path d={tagEdges[kind]} />
      </svg>
      <b>
        {name}
        {code}
      </b>
    </>
  );
}

/** The small tag by which every part, lot, unit, batch, order and invoice is shown, everywhere the same. */
export function Tag({ kind, code, story, to, size = 'normal' }: TagProps): ReactElement {
  const { anchor, card } = useHoverCard(story, {
    onCopy: () => copyText(code),
    onPrint: () => openPrint({ kind, code, story }),
  });
  const address = to === null ? undefined : (to ?? tagAddress(kind, code));
  const style = { fontSize: `${pixels[size] / 16}rem` };
  const copyOnKey = (event: KeyboardEvent): void => {
    if ((event.ctrlKey || event.metaKey) && event.key === 'c' && String(document.getSelection()) === '') copyText(code);
  };
  return (
    <>
      {address ? (
        <Body as={Link} {...anchor} {...{ to: address }} style={style} data-tag={kind} onKeyDown={copyOnKey}>
          <Drawing kind={kind} code={code} />
        </Body>
      ) : (
        <Body {...anchor} style={style} data-tag={kind}>
          <Drawing kind={kind} code={code} />
        </Body>
      )}
      {card}
    </>
  );
}
