/** What a file may hold; more is refused with the limit's name. */
export const readingLimits = {
  fileBytes: 64 * 1024 * 1024, rows: 2_000_000, columns: 64, lineCharacters: 64 * 1024, cellCharacters: 1024, preambleLines: 500, sweeps: 32,
} as const;
