/* The calculating part of the page with its data, in one piece that is loaded behind the page itself. */
export { evaluate } from '../evaluation/evaluate.ts'
export { loadLibrary } from '../library/library.ts'
