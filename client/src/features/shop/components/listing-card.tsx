import { styled } from '@mui/material/styles';
import type { ReactElement } from 'react';
import { Link } from 'react-router-dom';
import { Price } from '../../../components/figures';
import { formatDayShort } from '../../../lib/format-time';
import type { Listing } from '../api/shop';
import { ExplodedDrawing } from './exploded-drawing';

const Card = styled('article')(({ theme }) => ({
  display: 'grid',
  alignContent: 'start',
  gap: 8,
  padding: 20,
  background: theme.vars.palette.tone.sheet,
  border: `1px solid ${theme.vars.palette.tone.line}`,
  borderRadius: 3,
  '& h2': { ...theme.typography.h2, margin: 0 },
  '& p': { margin: 0 },
  '& .foot': { display: 'flex', flexWrap: 'wrap', gap: '2px 14px', alignItems: 'baseline' },
  '& .price': { fontWeight: 600, color: theme.vars.palette.tone.copper },
  '& .soft': { color: theme.vars.palette.tone.inkSoft },
}));

/** Cells that the drawing of a listing shows, by its key. */
export const cellsOfDrawing = (drawing: string): 3 | 4 => (drawing === 'heron-140' ? 4 : 3);

export function ListingCard({ listing }: { listing: Listing }): ReactElement {
  const { title, slug, summary, drawing, price, promise } = listing;
  return (
    <Card>
      {drawing ? <ExplodedDrawing label={`${title}, exploded view`} cells={cellsOfDrawing(drawing)} /> : null}
      <h2>
        <Link to={`/products/${slug}`}>{title}</Link>
      </h2>
      <p>{summary}</p>
      <p className="foot">
        <span className="price">{price ? <Price value={price.gross} /> : 'Ask us'}</span>
        <span className="soft">
          {promise.leavesBy ? `leaves by ${formatDayShort(promise.leavesBy)}` : 'none there just now'}
        </span>
      </p>
    </Card>
  );
}

export const CardGrid = styled('div')({
  display: 'grid',
  gridTemplateColumns: 'repeat(auto-fill, minmax(min(300px, 100%), 1fr))',
  gap: 20,
});
