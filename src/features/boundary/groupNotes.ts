/** Notes that say the same of several configurations, said once: `20 mm, 45 mm: …`. */
export function groupNotes(notes: readonly string[], labels: readonly string[]): string[] {
  const groups = new Map<string, string[]>();
  for (const note of notes) {
    const label = labels.find((one) => note.startsWith(`${one}: `));
    const text = label === undefined ? note : note.slice(label.length + 2);
    const group = groups.get(text) ?? [];
    if (label !== undefined) group.push(label);
    groups.set(text, group);
  }
  return [...groups].map(([text, of]) => (of.length === 0 ? text : `${of.join(', ')}: ${text}`));
}
