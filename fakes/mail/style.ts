/** The colours and type of the product on a page that shares no code with it. Fonts come from its own folder if there. */
export const style = `
@font-face{font-family:Title;src:url(/fonts/besley-latin-600-normal.woff2);font-weight:600}
@font-face{font-family:Body;src:url(/fonts/atkinson-hyperlegible-next-latin-wght-normal.woff2);font-weight:200 800}
:root{color-scheme:light dark;--ink:#1b1a17;--ink-2:#4c4a44;--ground:#f1f1ee;--sheet:#fff;--rule:#cbcac3;--loam:#26221e;--on-loam:#f4f1ec;--on-loam-2:#c9c1b6;--link:#1c5a78;--mist:#e4eaf0}
@media (prefers-color-scheme:dark){:root{--ink:#f1efe9;--ink-2:#c8c4ba;--ground:#171512;--sheet:#211e1a;--rule:#4a453c;--loam:#0f0e0c;--link:#8fc4de;--mist:#2c3640}}
*{box-sizing:border-box}
body{margin:0;background:var(--ground);color:var(--ink);font:17px/1.55 Body,system-ui,sans-serif}
header{background:var(--loam);color:var(--on-loam);padding:14px clamp(16px,4vw,32px)}
header b{font:600 21px/1.2 Title,serif}
header p{margin:4px 0 0;color:var(--on-loam-2);font-size:15px;max-width:75ch}
main{max-width:1000px;margin:0 auto;padding:24px clamp(16px,4vw,32px) 48px}
h1{font:600 clamp(23px,5vw,31px)/1.2 Title,serif;margin:0 0 16px;overflow-wrap:anywhere}
a{color:var(--link)} a:focus-visible,button:focus-visible,input:focus-visible,summary:focus-visible{outline:3px solid var(--link);outline-offset:2px}
.sheet{background:var(--sheet);border:1px solid var(--rule)}
.find{display:flex;flex-wrap:wrap;gap:10px;align-items:end;margin:0 0 18px}
.find label{font-size:15px;color:var(--ink-2);flex:1 1 240px}
.find input{display:block;width:100%;font:inherit;color:inherit;background:var(--sheet);border:1.5px solid var(--ink-2);padding:8px 10px}
.find button{font:600 16px Body,system-ui,sans-serif;background:transparent;color:var(--ink);border:1.5px solid var(--ink);padding:10px 16px}
ol{list-style:none;margin:0;padding:0}
ol li+li{border-top:1px solid var(--rule)}
ol a{display:grid;grid-template-columns:minmax(0,1fr) auto;gap:2px 18px;padding:12px 16px;color:inherit;text-decoration:none}
ol a:hover{background:var(--mist)}
ol strong{overflow-wrap:anywhere} ol span{color:var(--ink-2);font-size:15px;overflow-wrap:anywhere}
.none{padding:28px 16px;margin:0}
dl{display:grid;grid-template-columns:auto minmax(0,1fr);gap:4px 16px;margin:0;padding:14px 16px;border-bottom:1px solid var(--rule);font-size:16px}
dt{color:var(--ink-2)} dd{margin:0;overflow-wrap:anywhere}
.words{white-space:pre-wrap;overflow-wrap:anywhere;margin:0;padding:18px 16px;font:inherit;max-width:75ch}
iframe{display:block;width:100%;height:60vh;min-height:320px;border:0;background:#fff}
details{margin-top:18px} summary{cursor:pointer}
h2{font:600 19px Title,serif;margin:0;padding:14px 16px 0}
pre.lines{font-size:14px;white-space:pre-wrap;overflow-wrap:anywhere;padding:0 16px 16px;margin:8px 0 0}
@media (max-width:520px){ol a{grid-template-columns:minmax(0,1fr)}dl{grid-template-columns:minmax(0,1fr)}dd{margin-bottom:6px}}
`
