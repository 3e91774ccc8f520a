/** Numbers the steps: one line when a step is done, and one before it when it takes real work. @param {number} count */
export function steps(count) {
  let number = 1;
  return {
    /** Said before work that takes a while. @param {string} name @param {string} what */
    doing: (name, what) => console.log(`${number}/${count} ${name}: ${what}`),
    /** @param {string} name @param {string} what */
    done: (name, what) => console.log(`${number++}/${count} ${name}: ${what}`),
  };
}

/** @typedef {ReturnType<typeof steps>} Steps */
