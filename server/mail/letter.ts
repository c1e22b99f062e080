/** What a mail says, before it is dressed as text and as HTML. */
export interface Letter {
  subject: string
  /** Sentences, a paragraph each. */
  says: readonly string[]
  /** Named values, one a line. */
  facts?: readonly (readonly [name: string, value: string])[]
  link?: { words: string, url: string }
  /** Below the link. */
  after?: readonly string[]
}

const signature = 'This mail was sent by your department’s teaching labs. Nobody reads answers to it.'

export function asText({ says, facts = [], link, after = [] }: Letter): string {
  const blocks = [
    ...says,
    ...(facts.length > 0 ? [facts.map(([name, value]) => `${name}: ${value}`).join('\n')] : []),
    ...(link ? [`${link.words}:\n${link.url}`] : []),
    ...after,
    signature,
  ]
  return `${blocks.join('\n\n')}\n`
}

export function asHtml({ subject, says, facts = [], link, after = [] }: Letter): string {
  const paragraph = (text: string) => `<p>${escaped(text)}</p>`
  const rows = facts.map(([name, value]) => `<tr><th align="left" style="padding-right:1em">${escaped(name)}</th><td>${escaped(value)}</td></tr>`).join('')
  return [
    `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escaped(subject)}</title></head><body>`,
    ...says.map(paragraph),
    rows === '' ? '' : `<table>${rows}</table>`,
    link ? `<p><a href="${escaped(link.url)}">${escaped(link.words)}</a></p>` : '',
    ...after.map(paragraph),
    `<p><small>${escaped(signature)}</small></p></body></html>`,
  ].join('\n')
}

const escaped = (text: string) => text.replace(/[&<>"']/g, sign => `&#${sign.charCodeAt(0)};`)
