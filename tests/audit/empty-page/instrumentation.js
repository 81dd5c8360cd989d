export function register() {}
