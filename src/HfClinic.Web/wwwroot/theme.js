// Keeps the choice of light, dark or the device's setting for a year and applies it at once.
export function keep(cookie, word) {
  document.cookie = `${cookie}=${word}; path=/; max-age=31536000; samesite=lax`;
  document.documentElement.dataset.theme = word;
}
