/** "m•••@example.com": enough to recognize one's own address, nothing for others. */
export function maskEmail(email: string): string {
  const at = email.lastIndexOf('@');
  return `${email.slice(0, 1)}•••${email.slice(at)}`;
}
