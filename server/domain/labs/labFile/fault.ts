/** What is wrong in a lab's text, with the line on which it stands, counted from 1. */
export interface LabFileFault { line: number, message: string }
