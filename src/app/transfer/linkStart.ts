/** How the fragment of an address begins that carries a formula. */
export const linkStart = '#formula='
