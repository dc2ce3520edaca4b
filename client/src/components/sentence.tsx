import { Fragment, type ReactElement } from 'react';
import { Tag } from './tag/tag';
import { isTagKind, type TagKind } from './tag/tag-kinds';

type Piece = { text: string } | { kind: TagKind; code: string } | { name: string };

/**
 * Takes a sentence apart: `{order:O-2648-031} can't leave: the last {name:Heron 140} failed.`
 * Things in braces become their tags; names of products are set apart; everything else is plain text.
 */
export function piecesOf(sentence: string): readonly Piece[] {
  return sentence.split(/(\{[a-z]+:[^{}]+\})/).flatMap((piece): Piece[] => {
    if (piece === '') return [];
    const [, word = '', rest = ''] = /^\{([a-z]+):([^{}]+)\}$/.exec(piece) ?? [];
    if (word === 'name') return [{ name: rest }];
    return isTagKind(word) ? [{ kind: word, code: rest }] : [{ text: piece }];
  });
}

/** A sentence that the server composed, with the things it names shown as their tags. */
export function Sentence({ text }: { text: string }): ReactElement {
  return (
    <>
      {piecesOf(text).map((piece, place) => {
        if ('code' in piece) return <Tag key={place} kind={piece.kind} code={piece.code} />;
        return 'name' in piece ? <em key={place}>{piece.name}</em> : <Fragment key={place}>{piece.text}</Fragment>;
      })}
    </>
  );
}
