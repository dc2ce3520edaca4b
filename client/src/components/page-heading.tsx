import { styled } from '@mui/material/styles';
import type { ReactElement, ReactNode } from 'react';
import { useDocumentTitle } from '../lib/document-title';

const Row = styled('div')(({ theme }) => ({
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'flex-end',
  gap: '12px 24px',
  marginBottom: 18,
  '& > .words': { flex: '1 1 320px', minWidth: 0 },
  '& h1': { ...theme.typography.h1, margin: 0 },
  '& .lead': { color: theme.vars.palette.tone.inkSoft, margin: '4px 0 0' },
  '& .tags': { display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: 12, marginBottom: 8 },
  '& > .actions': { display: 'flex', flexWrap: 'wrap', gap: 10 },
}));

interface PageHeadingProps {
  /** The page's one `h1`. */
  title: ReactNode;
  /** What the browser's tab says, where the title is not plain text. */
  documentTitle?: string;
  /** The sentence that says how things stand. */
  lead?: ReactNode;
  /** The thing's own tag and what can be done with it, above the title. */
  tags?: ReactNode;
  /** Buttons; the primary one last. */
  actions?: ReactNode;
}

export function PageHeading({ title, documentTitle, lead, tags, actions }: PageHeadingProps): ReactElement {
  useDocumentTitle(documentTitle ?? (typeof title === 'string' ? title : undefined));
  return (
    <Row>
      <div className="words">
        {tags ? <div className="tags">{tags}</div> : null}
        <h1 tabIndex={-1}>{title}</h1>
        {lead ? <div className="lead">{lead}</div> : null}
      </div>
      {actions ? <div className="actions">{actions}</div> : null}
    </Row>
  );
}
