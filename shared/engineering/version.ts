/** Version of the engine, printed in every result. */
export const engineVersion = '0.1.0';
