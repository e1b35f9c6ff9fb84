import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';

/** What a page says whose address leads to nothing; the shell around it is the caller's. */
export function NothingHere({ href, word }: { href: string; word: string }) {
  return (
    <div className="max-w-form">
      <TitleBlock level={1} title="Nothing at this address" meta="404" />
      <p className="py-4">
        It was moved, called off, or belongs to another shop. Nothing of yours is lost: go back, or
        start again from here.
      </p>
      <LinkButton href={href}>{word}</LinkButton>
    </div>
  );
}
