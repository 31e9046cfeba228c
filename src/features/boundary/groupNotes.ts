/** The wire's names in a note, as the screen calls them. */
const screenNames: readonly (readonly [RegExp, string])[] = [
  [/^commonTorque50 and mu50 are null:/, 'There is no common torque and no fitted μ:'],
  [
    /^mu50 is null: no seat torque per unit of μ was sent\./,
    'There is no fitted μ: describe the seat first.',
  ],
];

/** Notes that say the same of several configurations, said once: `20 mm, 45 mm: …`. */
export function groupNotes(notes: readonly string[], labels: readonly string[]): string[] {
  const groups = new Map<string, string[]>();
  for (const written of notes) {
    const note = screenNames.reduce((text, [name, words]) => text.replace(name, words), written);
    const label = labels.find((one) => note.startsWith(`${one}: `));
    const text = label === undefined ? note : note.slice(label.length + 2);
    const group = groups.get(text) ?? [];
    if (label !== undefined) group.push(label);
    groups.set(text, group);
  }
  return [...groups].map(([text, of]) => (of.length === 0 ? text : `${of.join(', ')}: ${text}`));
}
