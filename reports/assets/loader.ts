/**
 * The one script that stands readable in the page: it inflates the rest, whose hash the policy lists too. Where a browser cannot inflate, the page stays as it is:
 * pictures and tables are complete without it.
 */
export const loader =
  "(async()=>{if(!('DecompressionStream'in window))return;const b=Uint8Array.from(atob(document.getElementById('live').textContent),c=>c.charCodeAt(0));const t=await new Response(new Blob([b]).stream().pipeThrough(new DecompressionStream('gzip'))).text();const s=document.createElement('script');s.textContent=t;document.head.append(s)})()";

/** The same where the script is a file of its own: the policy trusts what this one loads, and nothing that stands in the markup. */
export const sharedLoader =
  "(()=>{const s=document.createElement('script');s.src=document.getElementById('live').dataset.src;document.head.append(s)})()";
