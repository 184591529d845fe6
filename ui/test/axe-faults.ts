import axe from 'axe-core';

/** Accessibility faults of what is drawn. Colours are judged in a browser, and the landmarks are the shell's; a mail in its frame is its template's matter. */
export async function axeFaults(): Promise<string[]> {
  const rules = { 'color-contrast': { enabled: false }, region: { enabled: false } };
  const { violations } = await axe.run(document.body, { rules, iframes: false });
  return violations.map(({ id, nodes }) => `${id}: ${nodes.map(({ html }) => html).join(' ')}`);
}
