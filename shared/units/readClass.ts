import { plainText } from './plainText'
import type { ReadValue } from './readQuantity'

export interface ClassChoice { key: string, label: string, alsoTyped?: readonly string[] }

/** A class as typed or chosen: by key, label or another name in use, letter case and dashes left aside. `valueSi` is its place among the classes. */
export function readClass(typed: string, classes: readonly ClassChoice[]): ReadValue {
  const none = { typed: typed.slice(0, 200), valueSi: null, decimal: null, unitUcum: null, digits: null, halfUnitSi: null }
  const folded = fold(typed.slice(0, 200))
  if (folded === '') return { ...none, reading: 'empty', message: 'Nothing chosen yet.' }
  const at = classes.findIndex(one => [one.key, one.label, ...(one.alsoTyped ?? [])].some(name => fold(name) === folded))
  const found = classes[at]
  if (!found) return { ...none, reading: 'unreadable', message: `Not one of the classes: ${classes.map(one => one.label).join(', ')}.` }
  return { ...none, reading: 'class', valueSi: at, message: `read as “${found.label}”` }
}

const fold = (text: string): string => plainText(text).toLowerCase().replace(/[-_\s]+/g, ' ').replace(/[.!]$/, '').trim()
