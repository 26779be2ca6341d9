/** The Workroom follows the device between its light and its dark form, also when that changes at dusk. */
export function followDeviceTheme(): void {
  const dark = window.matchMedia('(prefers-color-scheme: dark)');
  const show = () => {
    document.documentElement.dataset.theme = dark.matches ? 'dark' : 'light';
  };
  show();
  dark.addEventListener('change', show);
}
