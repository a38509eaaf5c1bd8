/** What the tests share: published checks read from their files, fuels to burn, and short ways to the catalog. */
package fluewright.support;
