// Shows the notice while the circuit is down. Never reloads by itself: what was typed stays until the person decides.
const notice = document.getElementById('components-reconnect-modal');

notice.addEventListener('components-reconnect-state-changed', event => {
  const state = event.detail.state;
  notice.dataset.state = state;
  if (state === 'hide') notice.close();
  else if (!notice.open) notice.showModal();
});

notice.addEventListener('click', async event => {
  const wish = event.target.closest('[data-reconnect]')?.dataset.reconnect;
  if (wish === 'load') location.reload();
  if (wish === 'retry') await retry();
});

document.addEventListener('visibilitychange', async () => {
  if (document.visibilityState === 'visible' && notice.dataset.state === 'failed') await retry();
});

async function retry() {
  notice.dataset.state = 'retrying';
  try {
    const held = await Blazor.reconnect() || await Blazor.resumeCircuit();
    notice.dataset.state = held ? 'hide' : 'rejected';
    if (held) notice.close();
  } catch {
    notice.dataset.state = 'failed';
  }
}
