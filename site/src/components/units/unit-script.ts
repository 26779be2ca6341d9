/** Where the visitor's unit is remembered. */
export const UNIT_KEY = 'ellwand.unit';

/**
 * Runs before the first paint, so that nobody sees the wrong unit for a moment: the address wins, then what
 * was chosen before. It never changes with the page, so that the security policy can name it by its hash.
 */
export const unitScript =
  `(function(){try{var u=new URLSearchParams(location.search).get("unit")||localStorage.getItem("${UNIT_KEY}");` +
  'if(/^(mm|cm|in)$/.test(u))document.documentElement.dataset.unit=u}catch(e){}})()';
