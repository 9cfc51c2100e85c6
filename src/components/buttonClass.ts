const base =
  'inline-flex min-h-11 cursor-pointer items-center justify-center gap-2 rounded-[3px] border-2 px-4 py-1 md:whitespace-nowrap font-bold no-underline transition-colors duration-100 disabled:cursor-not-allowed aria-disabled:cursor-not-allowed';

const looks = {
  primary:
    'border-ink bg-ink text-paper hover:bg-sheet hover:text-ink disabled:border-edge disabled:bg-sheet disabled:text-muted',
  outlined:
    'border-ink bg-sheet text-ink hover:bg-ink hover:text-paper disabled:border-edge disabled:bg-sheet disabled:text-muted',
  plain:
    'border-transparent bg-transparent px-2 text-ink underline underline-offset-4 hover:border-ink disabled:text-muted',
} as const;

export type ButtonLook = keyof typeof looks;

/** The look shared by buttons and links that act like one: ink primary, outlined, or plain words. */
export const buttonClass = (look: ButtonLook, more = ''): string => `${base} ${looks[look]} ${more}`;
