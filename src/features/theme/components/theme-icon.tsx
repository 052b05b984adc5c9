import type { Theme } from '../theme'

/** A sun, a moon, a screen, drawn in a square of 16. */
const outlines: Readonly<Record<Theme, string>> = {
  light:
    'M8 5.2a2.8 2.8 0 1 0 0 5.6 2.8 2.8 0 0 0 0-5.6M8 1v1.6M8 13.4V15M1 8h1.6M13.4 8H15M3 3l1.2 1.2M11.8 11.8 13 13M13 3l-1.2 1.2M4.2 11.8 3 13',
  dark: 'M13.6 9.8A6.2 6.2 0 0 1 6.2 2.4a6.2 6.2 0 1 0 7.4 7.4Z',
  system: 'M1.7 2.5h12.6v8.3H1.7zM8 10.8v3M5.3 13.8h5.4',
}

export function ThemeIcon({ theme }: { readonly theme: Theme }) {
  return (
    <svg width="15" height="15" viewBox="0 0 16 16" aria-hidden="true" className="stroke-current">
      <path d={outlines[theme]} fill="none" strokeWidth="1.5" strokeLinecap="round" strokeLinejoin="round" />
    </svg>
  )
}
