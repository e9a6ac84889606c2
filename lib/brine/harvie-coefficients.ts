/**
 * Chebyshev coefficients of Pitzer's integral J(x) for unsymmetrical mixing.
 *
 * Source: Harvie 1981 (thesis, University of California, San Diego), printed in Pitzer 1991, "Activity coefficients in electrolyte solutions", and coded in
 * PHREEQC of the US Geological Survey. Index is k; `small` holds for x ≤ 1, `large` for x > 1.
 */
export const small: readonly number[] = [
  1.92515401481467, -0.060076477753119, -0.029779077456514, -0.007299499690937, 0.000388260636404, 0.000636874599598,
  3.6583601823e-5, -4.5036975204e-5, -4.53789571e-6, 2.937706971e-6, 3.96566462e-7, -2.02099617e-7, -2.5267769e-8,
  1.352261e-8, 1.229405e-9, -8.21969e-10, -5.0847e-11, 4.6333e-11, 1.943e-12, -2.563e-12, -1.0991e-11,
];

export const large: readonly number[] = [
  0.628023320520852, 0.462762985338493, 0.150044637187895, -0.028796057604906, -0.036552745910311, -0.001668087945272,
  0.006519840398744, 0.001130378079086, -0.000887171310131, -0.000242107641309, 8.7294451594e-5, 3.4682122751e-5,
  -4.583768938e-6, -3.548684306e-6, -2.5045388e-7, 2.16991779e-7, 8.077957e-8, 4.558555e-9, -6.944757e-9, -2.849257e-9,
  2.37816e-10,
];
