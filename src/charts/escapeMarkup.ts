/**
 * Plotly reads a little HTML in every label and hover text; text that came from a person is
 * escaped before it is drawn, so that a fixture called `<a href=…>` shows as written.
 */
export function escapeMarkup(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('>', '&gt;');
}
