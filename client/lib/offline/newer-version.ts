/** Another look for a newer version, ms. */
const LOOK_AGAIN = 30 * 60_000;

/**
 * Keeps the product on this device, and tells when a newer version has come. The answer of `onNewer` is the way to
 * take it: it closes no record, for records wait in storage that a version leaves alone.
 */
export async function keepOnDevice(onNewer: (take: () => void) => void): Promise<void> {
  if (!('serviceWorker' in navigator)) return;
  const { serviceWorker } = navigator;
  const registration = await serviceWorker.register('/service-worker.js');
  let taken = false;
  const offer = () => {
    const { waiting } = registration;
    // The first version ever has nothing to take the place of.
    if (!waiting || !serviceWorker.controller) return;
    onNewer(() => {
      taken = true;
      (registration.waiting ?? waiting).postMessage('take over');
    });
  };
  serviceWorker.addEventListener('controllerchange', () => {
    if (taken) window.location.reload();
  });
  registration.addEventListener('updatefound', () => {
    registration.installing?.addEventListener('statechange', offer);
  });
  offer();
  const look = () => {
    if (document.visibilityState === 'visible') registration.update().catch(() => undefined);
  };
  setInterval(look, LOOK_AGAIN);
  window.addEventListener('online', look);
}
