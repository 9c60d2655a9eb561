/** Settings that belong together: half of a group would mix a real service with a local one. */
const groups = [
  ['FILES_ENDPOINT', 'FILES_BUCKET', 'FILES_REGION', 'FILES_ACCESS_KEY', 'FILES_SECRET_KEY'],
  ['STRIPE_SECRET_KEY', 'STRIPE_WEBHOOK_SECRET'],
]

/**
 * What is missing from groups that are given in part.
 * @param {Record<string, string | undefined>} env
 * @returns {string[]} one sentence for each setting
 */
export function halfGivenSettings(env) {
  return groups
    .filter((group) => group.some((name) => env[name]))
    .flatMap((group) => {
      const given = group.find((name) => env[name])
      return group.filter((name) => !env[name]).map((name) => `${name} is missing, while ${given} is given`)
    })
}
