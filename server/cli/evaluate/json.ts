export type Json = null | boolean | number | string | readonly Json[] | { readonly [key: string]: Json | undefined }

/** One line of the answer, before it is written as JSON. */
export type AnswerLine = { readonly [key: string]: Json | undefined }
