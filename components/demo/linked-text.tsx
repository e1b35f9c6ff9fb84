/** A text with its web addresses as links, as a phone shows it. */
export function LinkedText({ text }: { text: string }) {
  const parts = text.split(/(https?:\/\/[^\s]+)/);
  return (
    <span className="break-words whitespace-pre-wrap">
      {parts.map((part, index) =>
        part.startsWith('http') ? (
          // The place in the text is what tells two equal parts apart.
          // biome-ignore lint/suspicious/noArrayIndexKey: the text never changes order
          <a key={index} href={part} className="text-blueprint underline">
            {part}
          </a>
        ) : (
          part
        ),
      )}
    </span>
  );
}
