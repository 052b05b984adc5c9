export type Theme = 'light' | 'dark' | 'system'

export const themes: readonly Theme[] = ['light', 'dark', 'system']

/** For `<html data-theme>`: nothing when the system decides. */
export function themeAttribute(theme: Theme): 'light' | 'dark' | undefined {
  return theme === 'system' ? undefined : theme
}

/** Shows the theme at once on the page that is open. */
export function applyTheme(theme: Theme): void {
  const attribute = themeAttribute(theme)
  if (attribute) document.documentElement.dataset.theme = attribute
  else delete document.documentElement.dataset.theme
}
