/** An e-mail address as `person.email_norm` holds it: one spelling for what people type in several. */
export const normalEmail = (typed: string): string => typed.trim().normalize('NFKC').toLowerCase()
