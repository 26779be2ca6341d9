/** Names this device among others, so that two readings of one point can be told apart. */
export function deviceName(): string {
  const key = 'ellwand.device';
  try {
    const known = localStorage.getItem(key);
    if (known) return known;
    const made = `Tablet ${Math.random().toString(36).slice(2, 6)}`;
    localStorage.setItem(key, made);
    return made;
  } catch {
    return 'Tablet';
  }
}
