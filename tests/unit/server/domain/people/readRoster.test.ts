import { describe, expect, it } from 'vitest'
import { DomainError } from '../../../../../shared/errors'
import { readRoster } from '../../../../../server/domain/people/roster/readRoster'

const read = (text: string) => readRoster({ text, delimiter: null, columns: null })
const reasonOf = (text: string): unknown => {
  try {
    read(text)
  }
  catch (error) {
    if (error instanceof DomainError) return error.facts.reason
    throw error
  }
  return null
}

describe('a roster file', () => {
  it('is read with a byte order mark, semicolons and Windows line ends', () => {
    const roster = read('\uFEFFName;E-mail;Section\r\nMüller, Jörg;JOERG@Example.edu ;A\r\n')
    expect(roster).toMatchObject({ delimiter: ';', columns: { email: 1, name: [0], section: 2 }, rows: [{ line: 2, name: 'Müller, Jörg', email: 'joerg@example.edu', section: 'A' }], refused: [] })
  })
  it('joins a first and a last name, whichever comes first', () => {
    expect(read('Last name,First name,Email address\nOkafor,Ngozi,n@example.edu').rows[0]).toEqual({ line: 2, email: 'n@example.edu', name: 'Ngozi Okafor', section: null })
  })
  it('keeps line numbers over blank lines and line breaks inside quotes', () => {
    const roster = read('name,email\n\n"Ann\nLee",ann@example.edu\nBo,not an address\n')
    expect(roster.rows).toEqual([{ line: 3, email: 'ann@example.edu', name: 'Ann Lee', section: null }])
    expect(roster.refused).toEqual([{ line: 5, text: 'Bo | not an address', reason: 'The e-mail is not an address.' }])
  })
  it('takes or refuses every line that has something on it', () => {
    const roster = read(['name,email,section', 'A,a@example.edu,1', 'B,,1', ',c@example.edu,1', '"=HYPERLINK(""x"")",d@example.edu,1', 'E,e@example.edu', 'F,A@example.edu,2', 'G,g@example.edu,=1+1', '   ', 'H,h@example.edu,007'].join('\n'))
    expect(roster.rows.map(row => [row.line, row.section])).toEqual([[2, '1'], [10, '007']])
    expect(roster.refused.map(({ line, reason }) => [line, reason])).toEqual([
      [3, 'No e-mail.'], [4, 'No name.'], [5, 'The name begins with "=", as a formula does.'], [6, '2 cells where the head has 3.'], [7, 'a@example.edu is on line 2 already.'], [8, 'The section is not a name.'],
    ])
    expect(roster.rows.length + roster.refused.length).toBe(roster.count)
  })
  it('is refused whole, with the reason, where no line can be a roster’s', () => {
    expect(reasonOf('\uFEFF  \n')).toBe('The file is empty.')
    expect(reasonOf('name,email\n')).toBe('There is a line of column names and nobody below it.')
    expect(reasonOf('PK\u0003\u0004\0\0')).toMatch(/not text/)
    expect(reasonOf('alpha,beta\n1,2\n')).toBe('No column is named like an e-mail and a name. The columns are: alpha, beta.')
    expect(reasonOf('just one column\nx\n')).toMatch(/one column only/)
  })
  it('follows the columns that a person chose', () => {
    expect(readRoster({ text: 'alpha,beta\nx@example.edu,Xu\n', delimiter: ',', columns: { email: 0, name: [1], section: null } }).rows).toEqual([{ line: 2, email: 'x@example.edu', name: 'Xu', section: null }])
  })
  it('reads a column named like a part of an object as any other', () => {
    expect(read('__proto__,name,email\nx,Pia,p@example.edu').rows).toHaveLength(1)
  })
})
