let pressed = false;
const waiting: (() => void)[] = [];

const release = () => {
  pressed = false;
  // After the click that follows the release.
  setTimeout(() => { for (const action of waiting.splice(0)) action(); }, 0);
};

if (typeof document !== 'undefined') {
  document.addEventListener('pointerdown', () => { pressed = true; }, true);
  for (const name of ['pointerup', 'pointercancel']) document.addEventListener(name, release, true);
}

/**
 * Runs an action, but not while a button is being pressed: words that appear above it when a field is left would move it away from under
 * the pointer, and the press would be lost.
 */
export function afterPress(action: () => void): void {
  if (pressed) waiting.push(action);
  else action();
}
