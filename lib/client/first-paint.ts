import { LIGHT_KEY, paper, PREFERENCES_KEY } from "./preferences";

/**
 * The inline script that dresses <html> as chosen before anything is painted: a page that turned dark a moment later
 * would blind someone at night. It is written by hand because it must stand alone and stay small, and a test holds it
 * to `attributesOf`. The build hashes it for the Content-Security-Policy as it does every inline script.
 */
export const FIRST_PAINT = `try{(function(){
var p=JSON.parse(localStorage.getItem("${PREFERENCES_KEY}")||"{}"),d=document,h=d.documentElement,l=p.look;
if(l==="light")l=localStorage.getItem("${LIGHT_KEY}");
if(l==="day"||l==="night"){h.setAttribute("data-look",l);
var m=d.createElement("meta");m.name="theme-color";m.content=l==="day"?"${paper.day}":"${paper.night}";
m.setAttribute("data-chosen","");d.head.prepend(m)}
if(p.hand==="left")h.setAttribute("data-hand","left");
if(["125","150","200"].indexOf(p.text)>=0)h.setAttribute("data-text",p.text)})()}catch(e){}`;
