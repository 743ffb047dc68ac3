@echo off
rem Starts Saddlebook on Windows. Environment: JAVA_HOME (else java from PATH), SADDLEBOOK_JAVA_OPTIONS.
setlocal EnableExtensions DisableDelayedExpansion
for %%I in ("%~dp0..") do set "product=%%~fI"

if defined JAVA_HOME goto java_home
for %%I in (java.exe) do set "java=%%~$PATH:I"
if not defined java goto no_java
for %%I in ("%java%\..\..") do set "home=%%~fI"
goto version
:java_home
set "java=%JAVA_HOME%\bin\java.exe"
set "home=%JAVA_HOME%"
if not exist "%java%" goto no_java

:version
set "version="
if exist "%home%\release" for /f "usebackq tokens=2 delims==" %%V in (`findstr /b "JAVA_VERSION=" "%home%\release"`) do set "version=%%~V"
if not defined version set "version=17"
for /f "tokens=1 delims=." %%F in ("%version%") do set "feature=%%F"
if %feature% LSS 17 goto no_java

set "options=-XX:TieredStopAtLevel=1 -XX:Tier3InvocationThreshold=1000 -XX:Tier3MinInvocationThreshold=500 -XX:Tier3CompileThreshold=5000 -XX:+UseSerialGC -XX:-UsePerfData -Xss1m -Xlog:disable -Xlog:all=off"
if /i not "%~1"=="desk" set "options=%options% -Djava.awt.headless=true"
if %feature% GEQ 24 set "options=%options% --enable-native-access=ALL-UNNAMED --sun-misc-unsafe-memory-access=allow"

set "lib=%product%\lib"
set "class_path=%lib%\org.saddlebook.launcher.jar;%lib%\org.apache.felix.framework.jar;%lib%\org.apache.felix.scr.jar;%lib%\jackson-core.jar;%lib%\org.osgi.service.component.jar;%lib%\org.osgi.util.promise.jar;%lib%\org.osgi.util.function.jar"
set "main=org.saddlebook.launcher.internal.Main"

rem The class archive belongs to one Java, one place and one build. Colons cannot stand in a folder name.
set "build=none"
if exist "%lib%\build-id" set /p build=<"%lib%\build-id"
set "java_key=%home::=%"
set "product_key=%product::=%"
set "shared=%product%\archive\%java_key%\%version%"
set "own=%LOCALAPPDATA%\Saddlebook\cache\archive\%java_key%\%version%\%product_key%"

if /i "%~1"=="prepare" goto prepare
set "archive=%shared%\%build%.jsa"
if exist "%archive%" goto run
set "archive=%own%\%build%.jsa"
if exist "%archive%" goto run
if exist "%own%\%build%.failed" goto run
if defined SADDLEBOOK_NO_ARCHIVE goto run
set "folder=%own%"
call :make_archive
:run
"%java%" %options% -Xshare:auto -XX:SharedArchiveFile="%archive%" %SADDLEBOOK_JAVA_OPTIONS% -cp "%class_path%" %main% %*
exit /b %ERRORLEVEL%

:prepare
set "folder=%shared%"
mkdir "%shared%" >nul 2>&1
copy nul "%shared%\writable" >nul 2>&1 || set "folder=%own%"
del "%shared%\writable" >nul 2>&1
call :make_archive
if exist "%folder%\%build%.jsa" (
    >&2 echo saddlebook: made %folder%\%build%.jsa
    exit /b 0
)
>&2 echo saddlebook: no class archive could be made in %folder%; Saddlebook works without it, only more slowly.
exit /b 1

:make_archive
mkdir "%folder%" >nul 2>&1
>&2 echo saddlebook: preparing a quicker start for this Java (once, some seconds) ...
set "fresh=%folder%\%RANDOM%%RANDOM%.tmp"
"%java%" %options% -cp "%class_path%" %main% version >nul 2>&1 <nul
"%java%" %options% -XX:ArchiveClassesAtExit="%fresh%" -Dsaddlebook.training=true -cp "%class_path%" %main% >nul 2>&1 <nul
if exist "%fresh%" (
    move /y "%fresh%" "%folder%\%build%.jsa" >nul 2>&1
) else (
    >"%folder%\%build%.failed" echo Java made no class archive; saddlebook prepare tries again.
)
goto :eof

:no_java
>&2 echo saddlebook: Saddlebook needs Java 17 or newer, and none was found by JAVA_HOME or on the PATH.
>&2 echo saddlebook: winget install EclipseAdoptium.Temurin.17.JDK, or https://adoptium.net; then set JAVA_HOME.
exit /b 2
