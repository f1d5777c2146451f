/**
 * Runs in the page: waits for plotly.js and for the picture's element, then puts the live plot in its place. Gives up
 * after about a minute and leaves the picture.
 */
export const figureScript = [
  "function(id,figure){var tries=0;function draw(){",
  "var place=document.querySelector('[data-rb-figure=\"'+id+'\"]:not([data-rb-live])');",
  "if(place&&window.Plotly){place.setAttribute('data-rb-live','');var plot=document.createElement('div');plot.style.height=figure.layout.height+'px';",
  "window.Plotly.newPlot(plot,figure.data,figure.layout,figure.config).then(function(){place.replaceChildren(plot)})",
  "['catch'](function(){place.removeAttribute('data-rb-live')});return}",
  "if(tries++<240)setTimeout(draw,tries<40?50:250)}draw()}",
].join("");
