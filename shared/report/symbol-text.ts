const LETTERS: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  Delta: 'Δ',
  epsilon: 'ε',
  eta: 'η',
  theta: 'θ',
  kappa: 'κ',
  lambda: 'λ',
  mu: 'μ',
  nu: 'ν',
  xi: 'ξ',
  pi: 'π',
  rho: 'ρ',
  sigma: 'σ',
  tau: 'τ',
  phi: 'φ',
  chi: 'χ',
  psi: 'ψ',
  omega: 'ω',
  Omega: 'Ω',
  Phi: 'Φ',
  Psi: 'Ψ',
  cdot: '·',
  cos: 'cos ',
  sin: 'sin ',
  sec: 'sec',
  arccos: 'arccos ',
  max: 'max',
  min: 'min',
};

/** A symbol's TeX in plain letters: `\tau_b` is `τb`, `4/\sqrt{h/t_w}` is `4/√(h/tw)`. */
export function symbolText(tex: string): string {
  return tex
    .replace(/\\sqrt\{((?:[^{}]|\{[^{}]*\})*)\}/g, '√($1)')
    .replace(/\\bar\{([^{}]*|\\[A-Za-z]+)\}/g, '$1\u0304')
    .replace(/\\(?:mathrm|mathit|text|operatorname)/g, '')
    .replace(/\\([A-Za-z]+)\s*/g, (_, name: string) => LETTERS[name] ?? name)
    .replace(/\\[,;:! ]/g, '\u2009')
    .replace(/\^\{?\*\}?/g, '*')
    .replace(/[{}_]/g, '');
}

/** Whether a symbol is an expression of its own (`L_c/r`), which stands in brackets as an operand. */
export const isCompound = (tex: string): boolean => {
  if (/^\|[^|]*\|$/.test(tex)) return false;
  const bare = tex.replace(/\{[^{}]*\}/g, '');
  const letters = bare.replace(/\\[A-Za-z]+/g, 'a').replace(/_[A-Za-z0-9]/g, '');
  return /[/^+\-*]/.test(letters) || letters.replace(/[_\s\\,]/g, '').length > 1;
};
