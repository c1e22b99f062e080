/** The judge's bundle as text, put into the server by `modules/reference.ts`. */
declare module '#reference' {
  export const bundle: string
  export const goldenSha256: string
}
