declare module '#routes' {
  export const routes: readonly { method: string, path: string, handler: unknown }[]
}
