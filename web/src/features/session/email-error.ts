/** What is wrong with an address as typed, or undefined. Asks only for the shape; the server knows the rest. */
export function emailError(typed: string): string | undefined {
  const text = typed.trim();
  if (text === '') return 'Enter an email address';
  if (!/^[^\s@]+@[^\s@]+\.[^\s@]+$/.test(text)) return 'Enter an email address like name@example.org';
  return undefined;
}
