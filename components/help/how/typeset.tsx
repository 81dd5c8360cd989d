import { useTranslations } from 'next-intl';
import { type NotationWord, notationWord } from './notation-words';

/**
 * Symbols as a book prints them, from a short notation: *x* is a quantity (italic), {_x} stands low, {^x} stands high,
 * {=x} is a word in the reader's language.
 * Plain text in the page, so that it can be copied, found and read out.
 */
export function Typeset({ notation }: { notation: string }) {
  const parts = notation.split(/(\*[^*]+\*|\{[_^=][^}]+\})/).filter((part) => part !== '');
  return (
    <span className="font-display">
      {parts.map((part, index) => (
        <Part key={index} part={part} />
      ))}
    </span>
  );
}

function Part({ part }: { part: string }) {
  if (part.startsWith('*')) return <i>{part.slice(1, -1)}</i>;
  if (part.startsWith('{_'))
    return (
      <sub className="text-[max(0.72em,11.5px)] leading-none">
        <Typeset notation={part.slice(2, -1)} />
      </sub>
    );
  if (part.startsWith('{^'))
    return (
      <sup className="text-[max(0.72em,11.5px)] leading-none">
        <Typeset notation={part.slice(2, -1)} />
      </sup>
    );
  if (part.startsWith('{=')) return <Word name={notationWord(part.slice(2, -1))} />;
  return part;
}

function Word({ name }: { name: NotationWord }) {
  const t = useTranslations('how.word');
  return t(name);
}
