/** Version of the engine's choices and numerics; changes that move results are listed in DEVELOPERS.md. */
export const ENGINE_VERSION = '0.1.0';
