/** Tolerance boxes of up to six parameters inside which every point meets all requirements. */
package binspan.study.box;
