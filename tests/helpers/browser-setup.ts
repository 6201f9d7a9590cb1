/**
 * A browser, a server and a database share the cores with every other test: a wait that ran out is tried once more, and the
 * first failure is shown. What is broken fails twice.
 */
jest.retryTimes(1, { logErrorsBeforeRetry: true });
