/** Goes to a page of the workroom by a full load, so that nothing of another session stays in memory. */
export function enter(path: string): void {
  window.location.assign(path)
}
