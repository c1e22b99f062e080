declare module '#app' {
  interface PageMeta { isPublic?: boolean }
}
export {}
