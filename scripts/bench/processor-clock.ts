/** Processor ms of this process so far: other programs on the machine do not count. */
export function processorMs(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1000;
}
