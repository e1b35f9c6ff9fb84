/**
 * A week without visits has nothing in it to move to, so its first day itself takes the keys that scroll
 * the hours: a cell of the calendar's grid, which may be reached where the grid's scroller may not.
 */
export function reachByKey({ el }: { el: HTMLElement }): void {
  if (el.previousElementSibling?.classList.contains('fc-timegrid-axis')) el.tabIndex = 0;
}
