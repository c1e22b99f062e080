import { describe, expect, it } from 'vitest'
import { Timeline } from '../../../seeds/timeline'

describe('a timeline', () => {
  it('does what it was told in the order of time, whatever the order of telling, and takes in what an event tells', async () => {
    const done: string[] = []
    const timeline = new Timeline(100)
    timeline.at(30, async () => { done.push('third') })
    timeline.at(10, async () => {
      done.push('first')
      timeline.at(20, async () => { done.push('second') })
    })
    timeline.at(30, async () => { done.push('fourth') })
    expect(await timeline.run()).toBe(4)
    expect(done).toEqual(['first', 'second', 'third', 'fourth'])
  })

  it('leaves out what has not happened yet, and refuses to change the past', async () => {
    const done: number[] = []
    const timeline = new Timeline(100)
    timeline.at(101, async now => done.push(now))
    timeline.at(50, async () => expect(() => timeline.at(40, async now => done.push(now))).toThrow(/had passed/))
    expect(await timeline.run()).toBe(1)
    expect(done).toEqual([])
  })
})
