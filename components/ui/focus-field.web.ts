/** Moves focus to a field by its id; for a group to the chosen radio, or its first control. */
export function focusField(id: string): void {
  const found = document.getElementById(id);
  const control = 'input,select,textarea,button,[tabindex="0"]';
  const target = found?.matches(control) ? found : (found?.querySelector<HTMLElement>('input:checked') ?? found?.querySelector<HTMLElement>(control) ?? found);
  if (!target) return;
  target.scrollIntoView({ block: 'center' });
  target.focus();
}
