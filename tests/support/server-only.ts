// Stands in for the package of this name, which throws outside a server bundle.
export {};
