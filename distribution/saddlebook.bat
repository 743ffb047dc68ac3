@echo off
rem Runs Saddlebook from a checkout: builds the product on first use, then hands over to its start script.
setlocal EnableExtensions DisableDelayedExpansion
if exist "%~dp0target\product\bin\saddlebook.bat" goto run
>&2 echo saddlebook: building the product (first use; some minutes) ...
if not exist "%~dp0target" mkdir "%~dp0target"
pushd "%~dp0.."
call mvn -B -q -DskipTests -Djacoco.skip -Dspotless.check.skip package -pl distribution -am >"%~dp0target\build.log" 2>&1
set "code=%ERRORLEVEL%"
popd
if not "%code%"=="0" (
    >&2 echo saddlebook: the build failed; its output is in %~dp0target\build.log
    exit /b 3
)
:run
call "%~dp0target\product\bin\saddlebook.bat" %*
exit /b %ERRORLEVEL%
