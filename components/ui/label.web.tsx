/** The words above a control: a real label, so that pressing it reaches the control. */
export function Label({ id, label, optional = false }: { readonly id: string; readonly label: string; readonly optional?: boolean }) {
  return (
    <label id={`${id}-label`} htmlFor={id} className="ui-label">
      {label}
      {optional ? <span className="ui-optional"> (if you like)</span> : null}
    </label>
  );
}
