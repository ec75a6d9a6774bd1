/** Kept beside the account's own choice, so that the pages before signing in look as the person left them. */
export const THEME_COOKIE = 'cellarsun.theme';

export type Theme = 'system' | 'limewash' | 'cellar';

export const isTheme = (value: unknown): value is Theme =>
  value === 'system' || value === 'limewash' || value === 'cellar';

/** Shows a theme at once and keeps it for a year; the account keeps it for good. */
export function showTheme(theme: Theme): void {
  if (theme === 'system') document.documentElement.removeAttribute('data-theme');
  else document.documentElement.dataset['theme'] = theme;
  const secure = window.location.protocol === 'https:' ? '; secure' : '';
  document.cookie = `${THEME_COOKIE}=${theme}; path=/; max-age=31536000; samesite=lax${secure}`;
}
