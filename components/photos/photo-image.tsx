/** A photo in its frame, fetched when it comes into view. */
export function PhotoImage({ src, words }: { src: string; words: string }) {
  return (
    // biome-ignore lint/performance/noImgElement: the framework's own fetches through its server, which has neither the phone's store nor the person's session
    <img src={src} alt={words} loading="lazy" className="size-full object-cover" />
  );
}
