import { onScopeDispose } from 'vue'

/**
 * Makes a call that is carried out once at the end of the frame, however often it is asked for.
 *
 * @param draw - what is done
 * @returns the way to ask for it
 */
export function useFrame(draw: () => void): () => void {
  let frame = 0
  onScopeDispose(() => cancelAnimationFrame(frame))
  return () => {
    if (frame !== 0) return
    frame = requestAnimationFrame(() => {
      frame = 0
      draw()
    })
  }
}
