import { useEffect } from 'react'

/**
 * Follows the version of a call that another form of the same page has just saved. A jump of more than one is somebody
 * else's change: it is not followed, so that the next saving compares.
 */
export function useFollowedVersion(
  version: number,
  form: { getValues: (name: 'version') => number; setValue: (name: 'version', value: number) => void },
): void {
  useEffect(() => {
    if (form.getValues('version') + 1 === version) form.setValue('version', version)
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [version])
}
