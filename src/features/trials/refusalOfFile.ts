const largestBytes = 16 * 1024 * 1024;

/** Why a file cannot be a log, before it is sent; null when it may be one. */
export function refusalOfFile(file: Pick<File, 'name' | 'size'>): string | null {
  if (file.size === 0) return `“${file.name}” is empty.`;
  if (file.size > largestBytes) {
    return `“${file.name}” is larger than 16 MiB. Split it, for instance by day.`;
  }
  return null;
}
