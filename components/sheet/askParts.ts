/** An ask as it is set: what is asked, each thing that it pins on a line of its own, and the form of the answer. */
export interface AskParts {
  lead: string
  pinned: { name: string, text: string }[]
  answer: string
}

/** The server prints an ask as sentences: the quantity first, then "Name: what is pinned.", the answer's unit and digits last. */
export function askParts(ask: string): AskParts {
  const [first = '', ...rest] = ask.split(/(?<=\.) (?=[\p{Lu}“])/u)
  const parts: AskParts = { lead: first, pinned: [], answer: '' }
  for (const sentence of rest) {
    const named = /^([^:“]{1,80}): (.+)$/s.exec(sentence)
    if (/^Answer (in|with) /.test(sentence)) parts.answer = parts.answer === '' ? sentence : `${parts.answer} ${sentence}`
    else if (named?.[1] && named[2] && parts.answer === '') parts.pinned.push({ name: named[1], text: named[2].replace(/\.$/, '') })
    else if (parts.pinned.length === 0 && parts.answer === '') parts.lead = `${parts.lead} ${sentence}`
    else parts.answer = `${parts.answer} ${sentence}`.trim()
  }
  return parts
}
