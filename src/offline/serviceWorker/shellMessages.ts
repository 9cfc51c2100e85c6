/** What the page may ask its worker about the app's own files, and what it hears. */
export interface ShellAnswers {
  /** Names the set of files; null when one of them is not in the cache. */
  SHELL_VERSION: string | null;
  /** Whether the page opens from the cache alone. */
  SHELL_OPENS: boolean;
  /** Fetches what is missing; answers whether the set is whole then. */
  SHELL_MEND: boolean;
}
export interface ShellQuestion {
  type: keyof ShellAnswers;
}
