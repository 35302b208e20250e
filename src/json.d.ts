/** Data files enter the program as unknown: the library room validates them before anything reads them. */
declare module '*.json' {
  const content: unknown
  export default content
}
