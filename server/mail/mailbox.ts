/**
 * An address that can stand in a header and in an SMTP command as it is: printable ASCII around one @.
 * Line breaks, spaces, brackets, quotes and letters outside ASCII are refused, not repaired.
 */
export function isMailbox(address: string): boolean {
  return address.length <= 254 && /^[A-Za-z0-9!#$%&'*+/=?^_`{|}~.-]{1,64}@[A-Za-z0-9](?:[A-Za-z0-9-]*[A-Za-z0-9])?(?:\.[A-Za-z0-9](?:[A-Za-z0-9-]*[A-Za-z0-9])?)*$/.test(address)
}

/** A person's name for a header: control characters become spaces; what is not ASCII is encoded by the sender. */
// eslint-disable-next-line no-control-regex -- control characters are what it takes out
export const headerName = (name: string): string => name.replace(/[\u0000-\u001f\u007f-\u009f\u2028\u2029]+/g, ' ').trim().slice(0, 120)
