/** A week without visits has nothing in it to move to, so its hours themselves take the keys that scroll. */
export function reachByKey({ el }: { el: HTMLElement }): void {
  for (const hours of el.querySelectorAll<HTMLElement>('.fc-scroller-liquid-absolute')) {
    hours.tabIndex = 0;
    hours.setAttribute('role', 'group');
    hours.setAttribute('aria-label', 'Hours of the days');
  }
}
