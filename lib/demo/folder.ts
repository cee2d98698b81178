import { resolve } from 'node:path'

/**
 * Where spoken lines and drawn films are kept. In the project's own data folder, whatever installation asks: they are
 * named after their content, and a test run needs not draw again what the demo has drawn.
 */
export const demoFolder = (): string => resolve('.data', 'demo')
