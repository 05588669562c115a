// Keyboard handling for whole pages. Markup speaks through data attributes; see Ui/Keys.cs.
//   data-key-list             a list whose rows take the arrows, j and k; data-key-follow: moving also opens the row
//   data-key-row="id"         one row, one tab stop for the whole list
//   data-key-open             the link or button Enter presses inside a row (else the row itself)
//   data-key="c"              pressed by that key; a field is focused instead. "Escape" closes, "/" searches, "?" helps
//   data-opens="id"           opens that <dialog>
const lettersKey = 'clinic-letter-keys';
const typing = 'input:not([type=checkbox],[type=radio],[type=button],[type=submit]),textarea,select,[contenteditable=true],[role=combobox],[role=textbox]';
let started = false;
let place = null;
let lastActive = null;

export function start() {
  if (started) return;
  started = true;
  document.addEventListener('keydown', onKey);
  document.addEventListener('focusin', onFocus);
  document.addEventListener('click', onClick);
  new MutationObserver(onChange).observe(document.body, { childList: true, subtree: true });
  onChange();
}

export const lettersOn = () => localStorage.getItem(lettersKey) !== 'off';
export const setLetters = on => localStorage.setItem(lettersKey, on ? 'on' : 'off');

// Focuses the row; where it has gone, the row that took its place.
export function focusRow(id) {
  const row = document.querySelector(`[data-key-row="${CSS.escape(id)}"]`);
  return focus(row ?? rowAtPlace());
}

// Focuses the row after the given one; after the last, the last.
export function focusRowAfter(id) {
  const row = document.querySelector(`[data-key-row="${CSS.escape(id)}"]`);
  if (!row) return focus(rowAtPlace());
  const all = rowsOf(row.closest('[data-key-list]'));
  return focus(all[Math.min(all.indexOf(row) + 1, all.length - 1)]);
}

function onKey(event) {
  if (event.defaultPrevented || event.isComposing || event.ctrlKey || event.altKey || event.metaKey) return;
  const inField = event.target.closest?.(typing);
  if (event.key === 'Escape') return onEscape(event, inField);
  if (inField) return;
  const modal = openModal();
  if (!modal && moves(event)) return;
  if (event.key === 'Enter') return onEnter(event, modal);
  if (event.key.length !== 1 || event.key === ' ' || !lettersOn()) return;
  const wanted = event.key.toLowerCase();
  const target = pick(`[data-key="${CSS.escape(wanted)}"]`, modal);
  if (!target) return;
  event.preventDefault();
  press(target);
}

// In a field, the first Escape only leaves the field: a typed line is not lost to a slip.
function onEscape(event, inField) {
  if (document.querySelector('.mud-popover-open') || openModal()) return;
  const close = pick('[data-key="Escape"]');
  if (inField) {
    const home = inField.closest('[data-key-home],[role=complementary],aside') ?? rowAtPlace();
    inField.blur();
    home?.focus({ preventScroll: true });
  } else if (close) {
    event.preventDefault();
    press(close);
  }
}

function onEnter(event, modal) {
  const row = event.target.closest?.('[data-key-row]');
  if (modal || !row || row !== event.target) return;
  event.preventDefault();
  open(row);
}

function moves(event) {
  const letters = lettersOn();
  const inRow = event.target.closest?.('[data-key-row]') || event.target === document.body || event.target.id === 'content' || event.target.tagName === 'H1';
  const step = { ArrowDown: inRow && 1, ArrowUp: inRow && -1, j: letters && 1, k: letters && -1 }[event.key];
  const edge = inRow && event.target !== document.body && { Home: 'first', End: 'last' }[event.key];
  if (!step && !edge) return false;
  const here = event.target.closest?.('[data-key-row]');
  const list = here?.closest('[data-key-list]') ?? document.querySelector('[data-key-list]');
  const all = list ? rowsOf(list) : [];
  if (!all.length) return false;
  const stop = here ?? all.find(row => row.tabIndex === 0) ?? all[0];
  const index = edge === 'first' ? 0 : edge === 'last' ? all.length - 1
    : !here && !place ? 0
    : Math.min(Math.max(all.indexOf(stop) + step, 0), all.length - 1);
  event.preventDefault();
  focus(all[index]);
  if ('keyFollow' in list.dataset) open(all[index]);
  return true;
}

function onFocus(event) {
  lastActive = event.target;
  const row = event.target.closest?.('[data-key-row]');
  const list = row?.closest('[data-key-list]');
  if (!list) return;
  const all = rowsOf(list);
  all.forEach(other => { other.tabIndex = other === row ? 0 : -1; });
  place = { list, id: row.dataset.keyRow, index: all.indexOf(row) };
}

function onClick(event) {
  const opener = event.target.closest?.('[data-opens]');
  if (opener) document.getElementById(opener.dataset.opens)?.showModal();
}

// One tab stop a list, and focus that fell out of the page with its element goes back to the list.
function onChange() {
  for (const list of document.querySelectorAll('[data-key-list]')) {
    const all = rowsOf(list);
    if (all.length && all.filter(row => row.tabIndex === 0).length !== 1)
      all.forEach((row, index) => { row.tabIndex = index === 0 ? 0 : -1; });
  }
  if (place && lastActive && !lastActive.isConnected && document.activeElement === document.body && !openModal()) {
    lastActive = null;
    focus(rowAtPlace());
  }
}

function rowAtPlace() {
  if (!place) return null;
  const list = place.list.isConnected ? place.list : document.querySelector('[data-key-list]');
  const all = list ? rowsOf(list) : [];
  return all.find(row => row.dataset.keyRow === place.id) ?? all[Math.min(place.index, all.length - 1)] ?? null;
}

function focus(row) {
  if (!row) return false;
  row.focus({ preventScroll: true });
  row.scrollIntoView({ block: 'nearest' });
  return document.activeElement === row;
}

function press(target) {
  if (target.matches(typing)) {
    target.focus();
    target.select?.();
  } else {
    target.click();
  }
}

// A key belongs to the open dialog, else to the focused row, else to the last shown part that offers it.
function pick(selector, modal) {
  const seen = [...(modal ?? document).querySelectorAll(selector)]
    .filter(element => !element.disabled && element.getAttribute('aria-disabled') !== 'true' && element.getClientRects().length);
  return seen.find(element => element.closest('[data-key-row]')?.contains(document.activeElement))
    ?? seen.filter(element => !element.closest('[data-key-row]')).at(-1) ?? null;
}

const open = row => (row.querySelector('[data-key-open]') ?? row).click();
const rowsOf = list => [...list.querySelectorAll('[data-key-row]')].filter(row => row.closest('[data-key-list]') === list);
const openModal = () => document.querySelector('dialog[open]') ?? document.querySelector('.mud-dialog-container .mud-dialog');
