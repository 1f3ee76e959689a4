/** Joule for one litre moved against one cmH2O; 0.0980665 rounded as the published formulas print it. */
export const joulePerLitreCmH2O = 0.098;
