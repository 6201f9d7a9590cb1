// A customer with a link has no use for an app that works without a signal, and must not be sent two megabytes of it.
if ('serviceWorker' in navigator && !location.pathname.startsWith('/view/')) {
  navigator.serviceWorker.register('/sw.js').catch((error) => {
    console.warn('Offsquare will not open without a signal on this device:', error);
  });
}
