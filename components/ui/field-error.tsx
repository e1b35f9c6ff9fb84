import { Glyph } from './glyph';
/** What is wrong with one field and what to type instead. */
export function FieldError({ id, error }: { id?: string; error?: string }) {
  if (!error) return null;
  return (
    <p id={id} className="text-note font-medium text-chalk">
      <Glyph name="problem" className="-ml-[0.3em] mr-[0.1em]" />
      {error}
    </p>
  );
}
