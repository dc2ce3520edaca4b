import type { ReactElement } from 'react';
import { sentenceOf } from '../../lib/problem';
import { Tag } from '../../components/tag/tag';
import type { Found } from './find-recent';
import { Choices } from './find-look';

interface FindChoicesProps {
  id: string;
  choices: readonly Found[];
  active: number;
  onChoose: (found: Found) => void;
  recent: boolean;
  pending: boolean;
  error: Error | null;
}

export function FindChoices({ id, choices, active, onChoose, recent, pending, error }: FindChoicesProps): ReactElement {
  return (
    <Choices>
      {recent ? <p>Where you were</p> : null}
      {/* oxlint-disable-next-line jsx-a11y/prefer-tag-over-role -- a select can't hold tags, nor leave the focus in the field */}
      <div role="listbox" id={id} aria-label={recent ? 'Where you were' : 'Found'}>
        {choices.map((found, place) => (
          // The focus stays in the field, which answers the keys; the pointer may press a line.
          <div
            key={found.to}
            // oxlint-disable-next-line jsx-a11y/prefer-tag-over-role -- as above
            role="option"
            tabIndex={-1}
            id={`${id}-${place}`}
            aria-selected={place === active}
            onPointerDown={(event) => {
              event.preventDefault();
              onChoose(found);
            }}
          >
            {found.kind === 'page' ? <span>{found.code}</span> : <Tag kind={found.kind} code={found.code} to={null} />}
            <span>{found.story ?? ''}</span>
          </div>
        ))}
      </div>
      {error ? <p role="alert">{sentenceOf(error).sentence}</p> : null}
      {!error && choices.length === 0 ? (
        <p>{pending ? 'Looking' : 'Nothing found. Try fewer letters, or the whole code.'}</p>
      ) : null}
    </Choices>
  );
}
