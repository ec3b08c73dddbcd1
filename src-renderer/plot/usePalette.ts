import { onScopeDispose, shallowRef, type ShallowRef } from 'vue'
import type { Theme } from './colour/colourMap'

/** The sheet's colours by role, as a canvas takes them. */
export interface Palette {
  theme: Theme
  paper: string
  drawer: string
  ink: string
  unit: string
  stale: string
  rule: string
  grid: string
  accent: string
  wash: string
}

const ROLES = ['paper', 'drawer', 'ink', 'unit', 'stale', 'rule', 'grid', 'accent', 'wash'] as const

/**
 * Reads the sheet's colours from the page, and again whenever its theme changes.
 *
 * @returns the colours of the moment
 */
export function usePalette(): ShallowRef<Palette> {
  const root = document.documentElement
  const palette = shallowRef(readPalette(root))
  const observer = new MutationObserver(() => (palette.value = readPalette(root)))
  observer.observe(root, { attributes: true, attributeFilter: ['data-theme'] })
  onScopeDispose(() => observer.disconnect())
  return palette
}

function readPalette(root: HTMLElement): Palette {
  const style = getComputedStyle(root)
  const colours = Object.fromEntries(ROLES.map((role) => [role, style.getPropertyValue(`--${role}`).trim()]))
  return {
    ...(colours as unknown as Omit<Palette, 'theme'>),
    theme: root.dataset.theme === 'dark' ? 'dark' : 'light',
  }
}
