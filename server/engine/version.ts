/**
 * Version of the calculation methods. It is stored with every plan, so that a signed figure can be explained later.
 * Raise it whenever the same input gives another number.
 */
export const ENGINE_VERSION = "1.0.0";
