/** Fields of a form that stand for fields of a file: they show its value, change it, and say what is wrong with it. */
package layerweft.desktop.form;
