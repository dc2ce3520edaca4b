import { styled } from '@mui/material/styles';
import { useQuery } from '@tanstack/react-query';
import type { ReactElement } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { Caution } from '../../../components/caution';
import { PageHeading } from '../../../components/page-heading';
import { Press } from '../../../components/press';
import { ErrorState, LoadingState } from '../../../components/states';
import { formatQuantity } from '../../../lib/format-quantity';
import { productQuery, type Product } from '../api/shop';
import { putInBasket, useBasket } from '../basket';
import { ExplodedDrawing } from '../components/exploded-drawing';
import { cellsOfDrawing } from '../components/listing-card';
import { CountryChoice, PriceLine, PromiseLine } from '../components/price-line';

const Layout = styled('div')(({ theme }) => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(0, 1.35fr) minmax(0, 1fr)',
  gap: 56,
  alignItems: 'start',
  [theme.breakpoints.down('md')]: { gridTemplateColumns: 'minmax(0, 1fr)', gap: 24 },
  '& h2': { ...theme.typography.h2, margin: '26px 0 8px' },
  '& .large': { fontSize: '1.125rem' },
  '& .soft': { color: theme.vars.palette.tone.inkSoft },
  '& table': { borderCollapse: 'collapse', width: '100%', fontSize: '0.875rem' },
  '& td': { padding: '7px 8px 7px 0', borderBottom: `1px solid ${theme.vars.palette.tone.line}`, verticalAlign: 'top' },
  '& td.mark': { width: 40, color: theme.vars.palette.tone.copper, fontWeight: 500 },
}));

const Forms = styled('nav')(({ theme }) => ({
  display: 'flex',
  margin: '6px 0 18px',
  border: `1px solid ${theme.vars.palette.tone.edge}`,
  borderRadius: 3,
  '& a': {
    flex: 1,
    padding: '12px 16px',
    color: theme.vars.palette.tone.ink,
    background: theme.vars.palette.tone.sheet,
    textDecoration: 'none',
  },
  '& a + a': { borderLeft: `1px solid ${theme.vars.palette.tone.edge}` },
  '& a[aria-current]': {
    background: theme.vars.palette.tone.boardSoft,
    outline: `2px solid ${theme.vars.palette.tone.board}`,
    outlineOffset: -2,
  },
  '& b': { display: 'block', fontWeight: 500 },
}));

const formWords = {
  tool: ['Ready to use', 'built and measured'],
  kit: ['As a kit', 'for you to build'],
} as const;

export function Component(): ReactElement {
  const { slug = '' } = useParams();
  const { country } = useBasket();
  const product = useQuery(productQuery(slug, country));
  if (product.isPending) return <LoadingState />;
  if (product.isError) {
    return (
      <>
        <PageHeading title="Product" />
        <ErrorState error={product.error} onRetry={() => void product.refetch()} what="This product" />
      </>
    );
  }
  return <ProductView product={product.data} />;
}

function ProductView({ product }: { product: Product }): ReactElement {
  const navigate = useNavigate();
  const cautions = [...product.cautions, ...(product.form === 'spare' ? [] : usualCautions)];
  const shown = product.drawing !== null || product.positions.length > 0 || product.contents.length > 0;
  const orderable = product.price !== null && product.promise.leavesBy !== null;
  return (
    <Layout>
      {shown ? (
        <section aria-label="What it is made of">
          {product.drawing ? (
            <ExplodedDrawing label={`${product.title}, exploded view`} cells={cellsOfDrawing(product.drawing)} />
          ) : null}
          {product.positions.length > 0 ? <Positions product={product} /> : null}
          {product.contents.length > 0 ? <Contents product={product} /> : null}
        </section>
      ) : null}
      <section aria-label="Order it">
        <PageHeading title={product.title} />
        <p className="large">{product.summary}</p>
        <FormChoice product={product} />
        <PriceLine listing={product} ask={product.ask} />
        <CountryChoice label="Change country" />
        <div className="large">
          <PromiseLine promise={product.promise} />
        </div>
        <Press
          main
          large
          disabled={!orderable}
          onPress={() => {
            putInBasket(product.id);
            void navigate('/basket');
          }}
        >
          Put in basket
        </Press>
        {cautions.length > 0 ? <h2>Before you use it</h2> : null}
        {cautions.map((caution) => (
          <div key={caution} style={{ marginBottom: 10 }}>
            <Caution>{caution}</Caution>
          </div>
        ))}
        {product.skills ? (
          <>
            <h2>What you need to be able to do</h2>
            <p>{product.skills}</p>
          </>
        ) : null}
        {product.description ? (
          <>
            <h2>What you get</h2>
            <p>{product.description}</p>
          </>
        ) : null}
      </section>
    </Layout>
  );
}

const usualCautions = [
  'Reaches 350 °C in seconds, and stays hot after the button is released. Solder where air moves.',
  'Lithium cells inside: charge with the lead supplied, do not open the pack, keep it dry.',
];

function FormChoice({ product }: { product: Product }): ReactElement | null {
  if (product.siblings.length === 0 || product.form === 'spare') return null;
  const all = [product, ...product.siblings].toSorted((a, b) => b.form.localeCompare(a.form));
  return (
    <>
      <div className="soft">How would you like it?</div>
      <Forms aria-label="How would you like it?">
        {all.map(({ id, slug, form }) => {
          const [name, note] = formWords[form === 'kit' ? 'kit' : 'tool'];
          return (
            <Link key={id} to={`/products/${slug}`} aria-current={id === product.id ? 'page' : undefined}>
              <b>{name}</b>
              <span className="soft">{note}</span>
            </Link>
          );
        })}
      </Forms>
    </>
  );
}

function Positions({ product }: { product: Product }): ReactElement {
  return (
    <table aria-label="Numbered positions of the drawing">
      <tbody>
        {product.positions.map(({ mark, name }) => (
          <tr key={`${mark} ${name}`}>
            <td className="mark">{mark}</td>
            <td>{name}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function Contents({ product }: { product: Product }): ReactElement {
  return (
    <>
      <h2>What is in the box</h2>
      <table aria-label="What is in the box">
        <tbody>
          {product.contents.map(({ bag, name, quantity, measure }) => (
            <tr key={`${bag} ${name}`}>
              <td className="mark">{bag}</td>
              <td>{name}</td>
              <td>{formatQuantity(quantity, measure)}</td>
            </tr>
          ))}
        </tbody>
      </table>
    </>
  );
}
