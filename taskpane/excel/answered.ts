/** The older part of Office.js answers through a callback. */
export function answered<T>(ask: (done: (result: Office.AsyncResult<T>) => void) => void): Promise<T> {
  return new Promise((resolve, reject) =>
    ask(({ status, value, error }) =>
      status === Office.AsyncResultStatus.Succeeded ? resolve(value) : reject(new Error(error.message)),
    ),
  );
}
