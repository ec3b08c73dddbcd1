import type { Span } from '../line/line'

/**
 * A stretch of the line between two nodes that have a law of their own. Positions 0..cells of a
 * block are its cell boundaries; position 0 and position `cells` are its own faces.
 */
export interface Block {
  kind: 'delay' | 'graded'
  bar: number
  /** Spans it covers, first and last. */
  firstSpan: number
  lastSpan: number
  cells: number
  /** Position of each of its spans' left faces, in order, and `cells` at the end. */
  spanStart: number[]
  /** Z of each cell, shape (cells) [kg/s]; shape (1) for a delay line. */
  impedance: Float64Array
  /** The line's node at its right face. */
  rightNode: number
}

/** Below this many cells a uniform span is marched cell by cell: a delay line would not pay. */
const SHORTEST_DELAY = 8

/**
 * Groups the spans of a line into blocks: each long uniform span is a delay line, each run of
 * tapers and short spans inside a bar is one graded block.
 *
 * @param spans the line's spans
 * @param isPlain true where node i (left of span i) is a bonded step without load inside a bar
 * @param spalls true where a span may come apart at any of its positions
 */
export function makeBlocks(
  spans: readonly Span[],
  isPlain: (node: number) => boolean,
  spalls: (span: Span) => boolean,
): Block[] {
  const blocks: Block[] = []
  const isDelay = (span: Span) => span.uniform && span.cells >= SHORTEST_DELAY && !spalls(span)
  for (let first = 0; first < spans.length;) {
    let last = first
    if (!isDelay(spans[first])) {
      while (last + 1 < spans.length && isPlain(last + 1) && !isDelay(spans[last + 1])) last++
    }
    blocks.push(makeBlock(spans, first, last, isDelay(spans[first])))
    first = last + 1
  }
  return blocks
}

function makeBlock(spans: readonly Span[], first: number, last: number, delay: boolean): Block {
  const members = spans.slice(first, last + 1)
  const spanStart = [0]
  for (const span of members) spanStart.push(spanStart[spanStart.length - 1] + span.cells)
  const cells = spanStart[members.length]
  const impedance = new Float64Array(delay ? 1 : cells)
  if (delay) impedance[0] = spans[first].impedance[0]
  else members.forEach((span, i) => impedance.set(span.impedance, spanStart[i]))
  return {
    kind: delay ? 'delay' : 'graded',
    bar: spans[first].bar,
    firstSpan: first,
    lastSpan: last,
    cells,
    spanStart,
    impedance,
    rightNode: last + 1,
  }
}
