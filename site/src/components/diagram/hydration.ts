/*
 * Drawings arrive drawn. While the browser takes a page over, each is left as it came, so that a first view
 * neither loads nor runs what draws them; pages reached afterwards draw their own.
 */
let takingOver = false;

export function beginTakingOver(): void {
  takingOver = true;
}

export function endTakingOver(): void {
  takingOver = false;
}

export function isTakingOver(): boolean {
  return takingOver;
}
