import { useQuery } from '@tanstack/react-query';
import { useEffect, useId, useRef, useState, type KeyboardEvent, type ReactElement } from 'react';
import { useNavigate } from 'react-router-dom';
import { sentenceOf } from '../../lib/problem';
import type { StaffRole } from '../../lib/area';
import { isTyping } from '../../lib/keyboard';
import { notify } from '../../lib/notify';
import { useScan } from '../../lib/use-scan';
import { FindChoices } from './find-choices';
import { findExactly, findPages, findQuery } from './find-query';
import { recentFinds, rememberFind, type Found } from './find-recent';
import { Field } from './find-look';

function useSlash(focus: () => void): void {
  const latest = useRef(focus);
  useEffect(() => {
    const listener = (event: globalThis.KeyboardEvent): void => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target)) return;
      event.preventDefault();
      latest.current();
    };
    document.addEventListener('keydown', listener);
    return () => document.removeEventListener('keydown', listener);
  }, []);
}

/** One field for everything: a scan or a few letters, and it goes there. Reached with `/`. */
export function FindField({ role }: { role: StaffRole }): ReactElement {
  const [text, setText] = useState('');
  const [open, setOpen] = useState(false);
  const [active, setActive] = useState(0);
  const input = useRef<HTMLInputElement>(null);
  const listId = useId();
  const navigate = useNavigate();
  const asked = text.trim();
  const things = useQuery(findQuery(asked));
  useSlash(() => input.current?.focus());

  const choices: readonly Found[] = asked === '' ? recentFinds() : [...(things.data ?? []), ...findPages(asked, role)];
  const go = (found: Found): void => {
    rememberFind(found);
    setText('');
    setOpen(false);
    input.current?.blur();
    void navigate(found.to);
  };
  const goTo = async (code: string): Promise<void> => {
    try {
      const found = await findExactly(code);
      if (found) go(found);
      else notify(`Nothing here carries the code ${code}.`, { tone: 'hot' });
    } catch (error) {
      notify(sentenceOf(error).sentence, { tone: 'hot' });
    }
  };
  useScan((code) => {
    void goTo(code);
    return true;
  });
  const onKeyDown = (event: KeyboardEvent): void => {
    const step = event.key === 'ArrowDown' ? 1 : event.key === 'ArrowUp' ? -1 : 0;
    if (step !== 0 && choices.length > 0) {
      event.preventDefault();
      setOpen(true);
      setActive((active + step + choices.length) % choices.length);
    } else if (event.key === 'Escape') {
      setOpen(false);
      input.current?.blur();
    } else if (event.key === 'Enter' && asked !== '') {
      const chosen = choices[active];
      // A scan ends before the answer is there; its code is asked for as it stands.
      if (chosen && !things.isFetching) go(chosen);
      else void goTo(asked);
    }
  };
  const shown = open && (choices.length > 0 || asked.length > 1);
  return (
    <Field>
      <input
        ref={input}
        type="search"
        role="combobox"
        aria-label="Find, or scan anything"
        aria-keyshortcuts="/"
        aria-expanded={shown}
        aria-controls={listId}
        aria-autocomplete="list"
        aria-activedescendant={shown && choices[active] ? `${listId}-${active}` : undefined}
        placeholder="Find, or scan anything"
        autoComplete="off"
        spellCheck={false}
        value={text}
        onFocus={() => setOpen(true)}
        onBlur={() => setOpen(false)}
        onChange={({ target }) => {
          setText(target.value);
          setActive(0);
          setOpen(true);
        }}
        onKeyDown={onKeyDown}
      />
      <kbd aria-hidden="true">/</kbd>
      {shown ? (
        <FindChoices
          id={listId}
          choices={choices}
          active={active}
          onChoose={go}
          recent={asked === ''}
          pending={things.isFetching}
          error={things.error}
        />
      ) : null}
    </Field>
  );
}
