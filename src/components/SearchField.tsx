import { Search } from 'lucide-react';
import { type FormEvent, useEffect, useRef, useState } from 'react';
import { useLocation, useNavigate, useSearchParams } from 'react-router-dom';

const isTyping = (target: EventTarget | null): boolean =>
  target instanceof HTMLElement &&
  (target.isContentEditable || ['INPUT', 'TEXTAREA', 'SELECT'].includes(target.tagName));

/** Searches the loft. The words live in the URL; filters that are set there stay. */
export function SearchField() {
  const field = useRef<HTMLInputElement>(null);
  const navigate = useNavigate();
  const { pathname } = useLocation();
  const [params] = useSearchParams();
  const inUrl = pathname === '/' ? (params.get('q') ?? '') : '';
  const [text, setText] = useState(inUrl);
  const [follows, setFollows] = useState(inUrl);
  if (follows !== inUrl) {
    setFollows(inUrl);
    setText(inUrl);
  }

  useEffect(() => {
    const focusOnSlash = (event: KeyboardEvent) => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || isTyping(event.target))
        return;
      event.preventDefault();
      field.current?.select();
      field.current?.focus();
    };
    window.addEventListener('keydown', focusOnSlash);
    return () => window.removeEventListener('keydown', focusOnSlash);
  }, []);

  const search = (event: FormEvent) => {
    event.preventDefault();
    const next = new URLSearchParams(pathname === '/' ? params : undefined);
    next.delete('cursor');
    if (text.trim() === '') next.delete('q');
    else next.set('q', text.trim());
    void navigate({ pathname: '/', search: next.toString() });
  };

  return (
    <search className="min-w-0 flex-1 lg:max-w-md lg:min-w-40">
      <form onSubmit={search} className="relative flex items-center">
        <Search size={18} strokeWidth={1.5} aria-hidden="true" className="absolute left-3 text-ink-soft" />
        <input
          ref={field}
          type="search"
          value={text}
          onChange={(event) => setText(event.target.value)}
          aria-label="Search the loft"
          aria-keyshortcuts="/"
          placeholder="tray 1/4 in mdf"
          maxLength={200}
          enterKeyHint="search"
          className="h-9 w-full min-w-0 appearance-none border border-ink bg-film pr-3 pl-9 placeholder:text-ink-soft focus:outline-2 focus:outline-layout md:pr-9"
        />
        <span
          aria-hidden="true"
          className="figures pointer-events-none absolute right-2 hidden border border-rule px-1.5 text-xs leading-5 text-ink-soft md:block"
        >
          /
        </span>
      </form>
    </search>
  );
}
