/** A term in running text: underlined with dots, so that it is not taken for an ordinary link. */
export const termClass =
  'cursor-help text-inherit underline decoration-water decoration-dotted decoration-2 underline-offset-4 hover:decoration-solid'
