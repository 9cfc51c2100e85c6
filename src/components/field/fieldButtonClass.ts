const base =
  'inline-flex min-h-[3.5rem] cursor-pointer items-center justify-center gap-2 rounded-[2px] border-2 px-3 py-1 text-center leading-tight font-bold no-underline disabled:cursor-not-allowed';

const looks = {
  primary:
    'border-ink bg-ink text-paper active:bg-sheet active:text-ink disabled:border-edge disabled:bg-sheet disabled:text-muted',
  outlined:
    'border-ink bg-sheet text-ink active:bg-ink active:text-paper disabled:border-edge disabled:text-muted',
  quiet: 'border-edge bg-sheet text-ink active:bg-ink active:text-paper disabled:text-muted',
  /** On the red screen: white is the ink there. */
  danger: 'border-white bg-white text-danger active:bg-danger active:text-white',
  dangerOutlined: 'border-white bg-danger text-white active:bg-white active:text-danger',
} as const;

export type FieldLook = keyof typeof looks;

/** The look of everything that is tapped in the field: 56 px high at least, square, no hover needed. */
export const fieldButtonClass = (look: FieldLook, more = ''): string => `${base} ${looks[look]} ${more}`;
