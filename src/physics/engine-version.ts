/** Version of the optical and dynamical engine; frozen into runs, and raised when any result can change. */
export const ENGINE_VERSION = '1.0.0';
