type Carrying<Taken> = {
  /** What is taken hold of there, or nothing. */
  take: (event: PointerEvent) => Taken | null;
  cellAt: (x: number, y: number) => HTMLElement | null;
  /** Beside the hand while it is carried; empty shows the thing itself. */
  words: (taken: Taken, x: number, y: number) => string;
  drop: (taken: Taken, x: number, y: number) => void;
};

/** So far the hand may tremble without anything being carried, in CSS pixels. */
const leastMove = 5;

/** Carries things over the page by mouse or pen, a picture of them under the hand. Gives what ends it. */
export function carry<Taken>({ take, cellAt, words, drop }: Carrying<Taken>): () => void {
  let stop = () => {};

  function begin(event: PointerEvent) {
    if (event.button !== 0 || event.pointerType === 'touch') return;
    const taken = take(event);
    const source = (event.target as Element).closest<HTMLElement>(
      '[data-visit-id], [data-waiting]',
    );
    if (taken === null || !source) return;
    const from = { x: event.clientX, y: event.clientY };
    let picture: HTMLElement | null = null;
    let over: HTMLElement | null = null;

    const mark = (cell: HTMLElement | null) => {
      if (over === cell) return;
      over?.removeAttribute('data-drop');
      cell?.setAttribute('data-drop', '');
      over = cell;
    };
    const move = ({ clientX: x, clientY: y }: PointerEvent) => {
      if (!picture && Math.hypot(x - from.x, y - from.y) < leastMove) return;
      if (!picture) {
        picture = lift(source, words(taken, x, y));
        document.documentElement.classList.add('is-carrying');
      }
      const said = words(taken, x, y);
      if (said) picture.textContent = said;
      picture.style.transform = `translate(${x + 8}px, ${y + 8}px)`;
      mark(cellAt(x, y));
    };
    const end = ({ clientX: x, clientY: y }: PointerEvent) => {
      const isCarried = picture !== null;
      stop();
      if (!isCarried) return;
      // The click that follows the drop opens nothing.
      window.addEventListener('click', swallow, { capture: true, once: true });
      setTimeout(() => window.removeEventListener('click', swallow, { capture: true }), 0);
      drop(taken, x, y);
    };
    const key = (pressed: KeyboardEvent) => {
      if (pressed.key === 'Escape') stop();
    };
    window.addEventListener('pointermove', move);
    window.addEventListener('pointerup', end);
    window.addEventListener('pointercancel', stop);
    window.addEventListener('keydown', key);
    stop = () => {
      mark(null);
      document.documentElement.classList.remove('is-carrying');
      picture?.remove();
      picture = null;
      window.removeEventListener('pointermove', move);
      window.removeEventListener('pointerup', end);
      window.removeEventListener('pointercancel', stop);
      window.removeEventListener('keydown', key);
    };
  }

  window.addEventListener('pointerdown', begin);
  return () => {
    stop();
    window.removeEventListener('pointerdown', begin);
  };
}

function swallow(event: Event) {
  event.preventDefault();
  event.stopPropagation();
}

function lift(source: HTMLElement, said: string): HTMLElement {
  const picture = document.createElement('div');
  const { width } = source.getBoundingClientRect();
  picture.className = 'board-bar board-carried';
  picture.style.cssText = `left: 0; top: 0; max-width: ${Math.max(80, Math.min(width, 260))}px; --crew: ${getComputedStyle(source).getPropertyValue('--crew') || 'var(--ink)'}`;
  picture.textContent = said || (source.querySelector('b, a')?.textContent ?? '');
  document.body.append(picture);
  return picture;
}
