const LOOKS = {
  solid: 'bg-ink text-paper font-semibold px-4.5 min-h-10 touch-44',
  outline: 'border border-ink text-ink font-semibold px-4.5 min-h-10 touch-44',
  plain: 'link-does min-h-6 touch-44',
  danger: 'min-h-6 touch-44 text-ember-ink underline underline-offset-4',
} as const;

/** `solid`: the one thing to do on a page; `outline`: another way; `plain`: words that do something. */
export type ButtonLook = keyof typeof LOOKS;

/** How a button looks, also for a link that stands in a button's place. */
export const buttonLook = (look: ButtonLook = 'solid') =>
  `inline-flex items-center justify-center text-14 cursor-pointer disabled:cursor-not-allowed disabled:opacity-60 ${LOOKS[look]}`;
