/* Preloaded into the server: should its starter be killed outright, it does not stay behind on the port. */
const parent = process.ppid;

setInterval(() => {
  if (process.ppid !== parent) process.exit(1);
}, 500).unref();
